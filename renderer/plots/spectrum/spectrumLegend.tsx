import { type Band } from '../../../core/transitions/types';
import { type LegendEntry } from '../frame';
import { bandDash, measuredDash } from './lineDash';

const line = (className: string, dash?: string) => (
  <path className={className} d="M0 7H32" strokeDasharray={dash} fill="none" />
);

/** What the lines of a spectrum mean; only what is drawn. */
export function spectrumLegend(drawn: {
  readonly hasPredicted: boolean;
  readonly hasRange: boolean;
  readonly bands: readonly Band[];
  readonly measured: readonly { readonly name: string }[];
  readonly allPredicted?: boolean;
}): LegendEntry[] {
  const has = (...kinds: Band['kind'][]): boolean => drawn.bands.some(({ kind }) => kinds.includes(kind));
  const entries: LegendEntry[] = [];
  if (drawn.hasPredicted) entries.push({ text: 'predicted', sample: line('spectrum-predicted') });
  if (drawn.hasRange) {
    entries.push({ text: '68 % range', sample: <rect className="spectrum-range" width={32} height={14} /> });
  }
  if (has('spin-allowed')) entries.push({ text: 'spin-allowed band', sample: line('spectrum-band') });
  if (has('spin-forbidden')) {
    entries.push({ text: 'spin-forbidden band', sample: line('spectrum-band', bandDash('spin-forbidden')) });
  }
  if (has('LMCT', 'MLCT', 'intervalence', 'ligand')) {
    entries.push({ text: 'charge transfer or ligand', sample: line('spectrum-band', bandDash('LMCT')) });
  }
  drawn.measured.forEach(({ name }, index) => {
    entries.push({
      text: drawn.allPredicted ? name : `measured: ${name}`,
      sample: line('spectrum-measured', measuredDash(index)),
    });
  });
  return entries;
}
