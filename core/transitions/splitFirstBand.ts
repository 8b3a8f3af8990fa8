import { wavelength_nm } from '../units';
import { axialComponents, placedDonors, type AxialComponent } from './axialSplitting';
import type { BandInput } from './bandInput';
import type { DdContext } from './ddContext';
import { absorptivityRange, roundAbsorptivity } from './intensity/intensityClass';
import type { Band } from './types';

/** Splits closer than this stay one band and only widen it, cm⁻¹. */
const resolved_cm1 = 1500;

const caveat =
  'split by unlike ligands after the mean of the donors in each plane; size and order of such splittings are not always predictable';

/** Mean over all donors of what each would give in all places, cm⁻¹; null where one of them is not told. */
function meanStrength({ donorStrengths = [], ligands }: BandInput): number | null {
  let [sum, places] = [0, 0];
  for (const { ligand, count } of ligands) {
    const strength = donorStrengths.find((donor) => donor.ligand.id === ligand.id);
    if (strength === undefined) return null;
    sum += strength.tenDq * count * ligand.denticity;
    places += count * ligand.denticity;
  }
  return sum / places;
}

/** Components of the first spin-allowed band; none where the rule does not hold or the donors are not told apart. */
function componentsOf({ input, symmetry, ground }: DdContext, band: Band): AxialComponent[] {
  const { donorStrengths = [], dElectrons, geometry, ligands, tenDq } = input;
  const holds = dElectrons === 3 || dElectrons === 8 || (dElectrons === 6 && ground.lowSpin);
  if (!holds || geometry !== 'octahedral' || !symmetry.mixed || !band.label.includes('T')) return [];
  const mean = meanStrength(input);
  if (mean === null || tenDq.value === null) return [];
  // The strengths are those of the tables; the complex may be taken at another metal-ligand distance.
  const scale = tenDq.value / mean;
  const strengths = new Map(
    donorStrengths.map(({ ligand: { id }, tenDq: strength }) => [
      id,
      {
        name: ligands.find(({ ligand }) => ligand.id === id)?.ligand.abbreviation ?? id,
        tenDq: strength * scale,
      },
    ]),
  );
  const donors = placedDonors(symmetry, strengths);
  return donors === null ? [] : axialComponents(donors);
}

/**
 * The first spin-allowed band as its components where unlike ligands split it widely, each as sure as the mean and half
 * of its own shift; one band, somewhat wider, where they do not.
 */
export function splitFirstBand(context: DdContext, band: Band): Band[] {
  const components = componentsOf(context, band);
  if (components.length < 2) return [band];
  const slope = band.slopeTenDq ?? 1;
  const spread = (components.at(-1)!.shift_cm1 - components[0]!.shift_cm1) * slope;
  const reasons = [...band.reasons, caveat];
  if (spread < resolved_cm1) {
    return [{ ...band, width_cm1: Math.round(Math.hypot(band.width_cm1, spread / 2) / 10) * 10, reasons }];
  }
  return components.map(({ shift_cm1, count, plane }) => {
    const energy_cm1 = band.energy_cm1 + slope * shift_cm1;
    // Not in proportion to its share: in trans-[Cr(en)2Cl2]+ both components are equally strong.
    const molarAbsorptivity = roundAbsorptivity(band.molarAbsorptivity * Math.sqrt(count / 2));
    return {
      ...band,
      energy_cm1,
      wavelength_nm: wavelength_nm(energy_cm1),
      sigma_cm1: Math.hypot(band.sigma_cm1, 0.5 * slope * shift_cm1),
      component: `in the plane of ${plane}`,
      molarAbsorptivity,
      molarAbsorptivityRange: absorptivityRange(molarAbsorptivity, band.kind),
      reasons,
    };
  });
}
