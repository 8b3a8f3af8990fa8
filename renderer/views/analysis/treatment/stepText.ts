import type { TreatmentStep } from '../../../../core/record/treatment';

const ranges = (list: readonly (readonly [number, number])[]): string =>
  list.map(([low, high]) => `${low} to ${high}`).join(', ');

/** One step in words. */
export function stepText(step: TreatmentStep): string {
  switch (step.op) {
    case 'state units':
      return `x taken as ${step.xUnit}, y as ${step.yUnit}`;
    case 'to absorbance':
      return 'turned into absorbance';
    case 'to percent transmittance':
      return 'turned into % transmittance';
    case 'merge equal x':
      return `points with the same x merged (${step.keep})`;
    case 'leave out':
      return `left out ${ranges(step.ranges)}${step.why === '' ? '' : `: ${step.why}`}`;
    case 'leave out above':
      return `left out above absorbance ${step.absorbance}`;
    case 'subtract blank':
      return 'blank subtracted';
    case 'subtract baseline':
      return `${step.form} baseline through ${ranges(step.ranges)} subtracted`;
    case 'subtract scatter':
      return `scatter ${step.exponent === null ? 'with fitted exponent' : `∝ λ^−${step.exponent}`} through ${ranges(step.ranges)} subtracted`;
    case 'to molar absorptivity':
      return `divided by ${step.concentration_mM.value} mM and ${step.path_cm.value} cm`;
    case 'smooth':
      return `shown smoothed over ${step.window} points, degree ${step.degree}`;
    case 'derivative':
      return `derivative ${step.order} over ${step.window} points shown`;
  }
}

/** `300-340, 800-900`, lower end first or not; null where it is no list of ranges. */
export function readRanges(text: string): [number, number][] | null {
  const parts = text.split(/[,;]/).map((part) => part.trim());
  const read = parts.map((part): [number, number] | null => {
    const match = /^(\d+(?:\.\d+)?)\s*(?:-|–|to)\s*(\d+(?:\.\d+)?)$/.exec(part);
    if (!match) return null;
    const [one, other] = [Number(match[1]), Number(match[2])];
    return one === other ? null : [Math.min(one, other), Math.max(one, other)];
  });
  return read.every((range) => range !== null) ? read : null;
}
