import { SpinhueError } from '../errors';
import type { SpectralBand } from '../spectrum/spectralBand';

const refuse = (
  code: 'not-finite' | 'out-of-range',
  field: string,
  found: unknown,
  remedy: string,
): never => {
  throw new SpinhueError({ code, field, message: `${field} is ${String(found)}; ${remedy}`, remedy });
};

/** Throws unless `value` is a finite number at least (`above`: greater than) `limit`. */
export function checkNumber(field: string, value: number, limit: number, above = false): void {
  const remedy = `give a number ${above ? 'greater than' : 'of at least'} ${limit}`;
  if (!Number.isFinite(value)) refuse('not-finite', field, value, remedy);
  if (above ? value <= limit : value < limit) refuse('out-of-range', field, value, remedy);
}

/** Throws unless every band has a finite place, a positive width and a height that is not negative. */
export function checkBands(bands: readonly SpectralBand[]): void {
  bands.forEach((band, index) => {
    checkNumber(`bands[${index}].energy_cm1`, band.energy_cm1, 0, true);
    checkNumber(`bands[${index}].width_cm1`, band.width_cm1, 0, true);
    checkNumber(`bands[${index}].molarAbsorptivity`, band.molarAbsorptivity, 0);
  });
}
