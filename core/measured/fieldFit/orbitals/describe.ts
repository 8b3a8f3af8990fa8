import { SpinhueError } from '../../../errors';
import type { FieldBand } from '../candidates';
import type { FieldFit } from '../fitField';
import type { FreeIonLimit } from '../freeIon';
import { fitOrbitals, type OrbitalFit } from './fitOrbitals';

const unpaired = (dElectrons: number): number => (dElectrons <= 5 ? dElectrons : 10 - dElectrons);

/** Ground multiplicities that a strong field of low symmetry may give: from all spins parallel down in steps of two. */
export function possibleMultiplicities(dElectrons: number): number[] {
  const list: number[] = [];
  for (let n = unpaired(dElectrons); n >= 0; n -= 2) list.push(n + 1);
  return list;
}

function openQuestions(fit: OrbitalFit, ratio: number, largestB: FreeIonLimit): string[] {
  const open: string[] = [];
  if (fit.freedom.orbitals === 'scale') {
    open.push(
      'orbital energies: too few bands for all of them; the typical pattern of this geometry was scaled as a whole',
    );
  }
  if (fit.B.value !== null && !fit.B.fitted) {
    open.push(
      `B: held at ${Math.round(fit.B.value)} cm-1, three quarters of ${largestB.of}; another band would tell`,
    );
  }
  if (fit.C !== null) open.push(`C: held at ${ratio} B; spin-forbidden bands would tell`);
  if (fit.tenDq === null)
    open.push('10Dq: has no meaning in this geometry; the orbital energies stand for it');
  return open;
}

/** A fit in a geometry without cubic symmetry, in the same form as one with it. */
export function fitLowSymmetry(
  geometry: string,
  dElectrons: number,
  bands: readonly FieldBand[],
  groundMultiplicities: readonly number[],
  ratio: number,
  largestB: FreeIonLimit,
): FieldFit {
  const fit = fitOrbitals(geometry, {
    dElectrons,
    bands,
    ratio,
    usualB: 0.75 * largestB.value,
    groundMultiplicities,
  });
  if (fit === null) {
    throw new SpinhueError({
      code: 'unknown-geometry',
      field: 'geometry',
      message: `no field can be fitted for the geometry ${geometry}`,
      remedy:
        'choose octahedral, tetrahedral, square-planar, square-pyramidal, trigonal-bipyramidal, trigonal-planar or linear',
    });
  }
  const degreesOfFreedom = bands.length - fit.freeParameters;
  const scale = degreesOfFreedom > 0 ? Math.max(1, Math.sqrt(fit.chi2 / degreesOfFreedom)) : 1;
  const wide = (se: number | null): number | null => (se === null ? null : se * scale);
  const residuals = bands.map((band, i) => band.energy_cm1 - fit.calculated[i]!);
  const warnings: string[] = [];
  if (!fit.isGround)
    warnings.push(
      'with these parameters the ground level has another spin: the bands do not fit that spin state',
    );
  if (fit.B.fitted && fit.B.value! > largestB.value) {
    warnings.push(
      `B of ${Math.round(fit.B.value!)} cm-1 lies above ${largestB.of} (${largestB.value} cm-1): the assignment or a band position is wrong`,
    );
  }
  return {
    tenDq:
      fit.tenDq === null
        ? { value: null, se: null, status: 'not determined' }
        : { value: fit.tenDq.value, se: wide(fit.tenDq.se), status: 'fitted' },
    B: {
      value: fit.B.value,
      se: wide(fit.B.se),
      status: fit.B.value === null ? 'not determined' : fit.B.fitted ? 'fitted' : 'held',
    },
    C: {
      value: fit.C,
      se: null,
      status: fit.C === null ? 'not determined' : fit.B.fitted ? 'tied to B' : 'held',
    },
    orbitals: fit.orbitals.map((orbital) => ({ ...orbital, se: wide(orbital.se) })),
    groundTerm: fit.groundLabel,
    assignment: bands.map((band, i) => ({
      energy_cm1: band.energy_cm1,
      calculated_cm1: fit.calculated[i]!,
      residual_cm1: residuals[i]!,
      label: `${fit.levels[i]!.multiplicity}${fit.levels[i]!.label ?? ''}`,
      multiplicity: fit.levels[i]!.multiplicity,
    })),
    correlation: null,
    rms_cm1: Math.sqrt(residuals.reduce((sum, value) => sum + value * value, 0) / bands.length),
    chi2: fit.chi2,
    degreesOfFreedom,
    notDetermined: openQuestions(fit, ratio, largestB),
    warnings,
    remarks:
      degreesOfFreedom === 0
        ? ['as many bands as parameters: the fit is exact and says nothing about whether the model holds']
        : [],
    alternatives: [],
    textbook: null,
  };
}
