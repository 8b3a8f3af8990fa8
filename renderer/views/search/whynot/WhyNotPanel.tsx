import { useId, useMemo, useState } from 'react';
import { type FormulaProblem, readFormula } from '../../../../core/formula';
import type { WishInput } from '../../../../core/search';
import { Field } from '../../../app/form';
import { useProject } from '../../../app/session/ProjectSession';
import { useLibrary } from '../../../app/session/useLibrary';
import { ErrorPanel, formatShare, Formula, Swatch } from '../../../parts';
import type { ShownResult } from '../../../workers/search/protocol';
import { useReply } from '../asking/useReply';
import { PartList } from '../results/PartList';

interface WhyNotPanelProps {
  readonly wish: WishInput;
  readonly results: readonly ShownResult[];
}

/** For a complex that was expected on the list: which part of the wish it fails, and by how much. */
export function WhyNotPanel({ wish, results }: WhyNotPanelProps) {
  const title = useId();
  const library = useLibrary();
  const { overlay } = useProject();
  const [text, setText] = useState('');
  const read = useMemo(() => (text.trim() === '' ? null : readFormula(text, library)), [text, library]);
  const composition = read?.ok === true ? read.value.composition : null;
  const { reply, current, error } = useReply(
    composition === null ? null : { kind: 'score', wish, overlay, composition },
  );
  return (
    <section className="panel stack" aria-labelledby={title}>
      <h2 id={title}>Why not this one?</h2>
      <Field
        label="A complex that you expected"
        hint="its formula or name, such as [Fe(bpy)3]2+ or cis-[Co(en)2Cl2]+"
        error={read?.ok === false ? problemText(read.problem) : null}
      >
        {(attributes) => (
          <input
            {...attributes}
            autoComplete="off"
            spellCheck={false}
            value={text}
            onChange={(event) => setText(event.currentTarget.value)}
          />
        )}
      </Field>
      {error !== null && <p role="alert">{error}</p>}
      {composition !== null && !current && <p className="soft">Estimating…</p>}
      {composition !== null && current && reply?.kind === 'refused' && (
        <ErrorPanel problems={reply.problems} title="It cannot be held against the wish" />
      )}
      {composition !== null && current && reply?.kind === 'scored' && (
        <div className="why-not" aria-live="polite">
          <p>
            <strong>
              <Formula formula={reply.scored.formula} />
            </strong>{' '}
            would meet the whole wish with a chance of{' '}
            <strong className="figures">{formatShare(reply.scored.score.probability)}</strong>
            {standing(reply.scored.score.probability, results)}
          </p>
          <Swatch
            colour={reply.scored.summary.ok ? reply.scored.summary.colour : null}
            size="row"
            text="words"
          />
          {reply.scored.exclusions.length > 0 && (
            <div>
              <p>The search does not look at it:</p>
              <ul>
                {reply.scored.exclusions.map(({ part, because }) => (
                  <li key={`${part} ${because}`}>{because}</li>
                ))}
              </ul>
            </div>
          )}
          {reply.scored.score.parts.length > 0 && <PartList parts={byChance(reply.scored.score.parts)} />}
        </div>
      )}
    </section>
  );
}

const problemText = ({ at, message, suggestions }: FormulaProblem): string =>
  `${message}, at character ${at + 1}.${suggestions.length === 0 ? '' : ` Is it ${suggestions.join(' or ')}?`}`;

const byChance = <T extends { readonly probability: number }>(parts: readonly T[]): T[] =>
  [...parts].sort((one, other) => one.probability - other.probability);

/** Where it would stand on the list as it is. */
function standing(probability: number, results: readonly ShownResult[]): string {
  if (results.length === 0) return '.';
  const better = results.filter((each) => each.probability > probability).length;
  if (better === 0) return ': no listed result is likelier.';
  if (better < results.length) return `; ${better} of the listed results are likelier.`;
  const last = results.at(-1)!.probability;
  return `; the last of the ${results.length} listed has ${formatShare(last)}.`;
}
