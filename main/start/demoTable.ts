import { colourDifference } from '../../core/colour';
import { standingCaution } from '../../core/library';
import { demoProject } from '../../core/library/demo';
import { predict, type PredictionOutcome } from '../../core/prediction';
import { rankTable } from './rankTable';

const lineLength = 100;

function wrapped(text: string, indent = ''): string {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    if (line !== '' && indent.length + line.length + 1 + word.length > lineLength) {
      lines.push(line);
      line = word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  return [...lines, line].map((each, i) => (i === 0 ? '' : indent) + each).join('\n');
}

/** Each caution once, under the substance that it is about. */
function cautionLines(outcomes: readonly PredictionOutcome[]): string[] {
  const lines = outcomes.flatMap((outcome) =>
    outcome.ok ? outcome.prediction.cautions.map(({ about, text }) => `- ${about}: ${text}`) : [],
  );
  return [...new Set(lines)].sort().map((line) => wrapped(line, '  '));
}

/** The demo project, predicted and ranked by the distance of the seen colour from the project's target, as text. */
export function demoTable(): string {
  const { name, notes, targetLab, candidates } = demoProject;
  const outcomes = candidates.map(({ id, composition, concentration_mM, path_cm, counterIon }) =>
    predict({ id, ...composition, concentration_mM, path_cm }, { counterIon, place: id }),
  );
  const table = rankTable(name, outcomes, ({ colour }) =>
    colour === null ? null : colourDifference([...colour.lab], [...targetLab]),
  );
  return [
    wrapped(notes),
    '',
    table,
    '',
    wrapped(
      'Estimates before synthesis. ± is one standard deviation of 10Dq. "first band" is the spin-allowed band of lowest ' +
        'energy. dE00 is the CIEDE2000 distance of the seen colour from the target at the stated strength and path.',
    ),
    '',
    'Cautions:',
    ...cautionLines(outcomes),
    wrapped(standingCaution),
  ].join('\n');
}
