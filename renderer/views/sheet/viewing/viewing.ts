import { defaultViewing } from '../../../../core/colour';
import type { IlluminantId, ObserverId } from '../../../../core/library/colourTables';
import { findSolvent } from '../../../../core/spectrum';

/** How a sheet looks at its complex. Nothing of it is stored until the user keeps it. */
export interface Viewing {
  readonly concentration_mM: number;
  readonly path_cm: number;
  readonly temperature_K: number;
  readonly illuminant: IlluminantId;
  readonly observer: ObserverId;
  /** Id of a solvent window; null for none in particular. */
  readonly solvent: string | null;
  readonly matter: 'solution' | 'powder';
}

export const roomTemperature_K = 298.15;

/** Daylight, room temperature and the strength of the candidate. */
export const plainViewing = (strength: Pick<Viewing, 'concentration_mM' | 'path_cm'>): Viewing => ({
  ...strength,
  temperature_K: roomTemperature_K,
  ...defaultViewing,
  solvent: null,
  matter: 'solution',
});

export const isPlain = (
  viewing: Viewing,
  strength: Pick<Viewing, 'concentration_mM' | 'path_cm'>,
): boolean => {
  const plain = plainViewing(strength);
  return (Object.keys(plain) as (keyof Viewing)[]).every((key) => plain[key] === viewing[key]);
};

/** Between which wavelengths the solvent lets light through; null where no solvent is named. */
export function solventWords(id: string | null): string | null {
  const window = id === null ? undefined : findSolvent(id);
  if (window === undefined) return null;
  const { name, cutOff_nm, nearInfraredFrom_nm } = window;
  return `Bands below ${cutOff_nm} nm${nearInfraredFrom_nm === null ? '' : ` and beyond ${nearInfraredFrom_nm} nm`} are hidden by the ${name} itself.`;
}
