import type { Flag } from '../../../../core/estimation/types';

const words: Readonly<Record<Flag['severity'], string>> = {
  invalid: 'Do not trust',
  caution: 'Take care',
  note: 'Note',
};
const order: readonly Flag['severity'][] = ['invalid', 'caution', 'note'];

/** Remarks on an estimate, gravest first. */
export const PaperRemarks = ({ flags }: { readonly flags: readonly Flag[] }) => (
  <ul className="paper-small">
    {order.flatMap((severity) =>
      flags
        .filter((flag) => flag.severity === severity)
        .map(({ code, message }) => (
          <li key={code + message}>
            <strong>{words[severity]}:</strong> {message}
          </li>
        )),
    )}
  </ul>
);
