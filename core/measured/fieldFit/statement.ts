import type { FieldBand } from './candidates';
import type { FieldFit, CubicRequest, FittedParameter, Trial } from './fitField';
import type { FreeIonLimit } from './freeIon';
import { levelsFrom, sameLevel, type LevelKey } from './model';
import { solveField, type FieldSolution } from './solve';
import type { TextbookValue } from './textbook';

interface Account {
  readonly request: CubicRequest;
  readonly bands: readonly FieldBand[];
  readonly best: Trial;
  readonly trials: readonly Trial[];
  readonly largestB: FreeIonLimit;
  readonly textbook: TextbookValue | null;
}

const rms = (bands: readonly FieldBand[], solution: FieldSolution): number =>
  Math.sqrt(
    bands.reduce((sum, band, i) => sum + (band.energy_cm1 - solution.predicted[i]!) ** 2, 0) / bands.length,
  );

const labelOf = (trial: Trial, request: CubicRequest): ((key: LevelKey) => string) => {
  const { levels } = levelsFrom(
    request.dElectrons,
    request.geometry,
    trial.solution.parameters,
    trial.groundMultiplicity,
  );
  return (key) => levels.find((level) => sameLevel(level, key))?.label ?? '?';
};

/** Largest slope of any assigned level with respect to one parameter; zero where the bands do not feel it. */
function feels(trial: Trial, request: CubicRequest, name: 'B' | 'C'): boolean {
  const { levels } = levelsFrom(
    request.dElectrons,
    request.geometry,
    trial.solution.parameters,
    trial.groundMultiplicity,
  );
  return trial.levels.some((key) => {
    const slope = levels.find((level) => sameLevel(level, key))?.slope[name] ?? 0;
    return Math.abs(slope) > 1e-6;
  });
}

/** How the fitted values move when C/B is held elsewhere: what the assumption costs. */
function shiftWithRatio({ request, bands, best }: Account, ratio: number): { tenDq: number; B: number } {
  const targets = bands.map((band, i) => ({ ...band, level: best.levels[i]! }));
  const { parameters } = solveField(
    request.dElectrons,
    request.geometry,
    best.groundMultiplicity,
    targets,
    { ...best.solution.parameters, C: ratio * best.solution.parameters.B },
    { ...best.freedom, C: { ratio } },
  );
  return parameters;
}

function openQuestions(account: Account): string[] {
  const { request, best } = account;
  const { freedom } = best;
  const open: string[] = [];
  const ratio = typeof freedom.C === 'object' ? freedom.C.ratio : null;
  if (!freedom.B) {
    open.push(
      feels(best, request, 'B')
        ? `B: ${account.bands.length === 1 ? 'one band' : 'these bands'} cannot give 10Dq and B; B was held at ${Math.round(best.solution.parameters.B)} cm-1, three quarters of ${account.largestB.of}, and 10Dq depends on that`
        : 'B: the bands given do not depend on it; a second spin-allowed band would tell',
    );
  }
  if (ratio !== null) {
    if (!feels(best, request, 'C')) {
      open.push('C: the bands given do not depend on it; a spin-forbidden band would tell');
    } else {
      const [low, high] = [shiftWithRatio(account, ratio - 0.5), shiftWithRatio(account, ratio + 0.5)];
      const spread = (name: 'tenDq' | 'B') =>
        `${name === 'tenDq' ? '10Dq' : 'B'} from ${Math.round(low[name])} to ${Math.round(high[name])} cm-1`;
      open.push(
        `C: cannot be told apart from B with these bands; C/B was held at ${ratio}. Between C/B ${ratio - 0.5} and ${ratio + 0.5} go ${spread('tenDq')}${freedom.B ? ` and ${spread('B')}` : ''}`,
      );
    }
  }
  return open;
}

function warningsOn(account: Account, scale: number): string[] {
  const { best, largestB, bands, request } = account;
  const warnings: string[] = [];
  const { parameters, rawSe } = best.solution;
  if (best.freedom.B && parameters.B > largestB.value) {
    const se = rawSe.B === null ? 0 : rawSe.B * scale;
    warnings.push(
      `B of ${Math.round(parameters.B)} cm-1 lies above ${largestB.of} (${largestB.value} cm-1)${
        parameters.B - largestB.value < 2 * se ? ', though within two standard errors' : ''
      }: a covalent bond lowers B, so the assignment or a band position is wrong`,
    );
  }
  if (best.freedom.B && parameters.B < 0.3 * largestB.value) {
    warnings.push(
      `B of ${Math.round(parameters.B)} cm-1 is less than a third of ${largestB.of}: unusual, check the assignment`,
    );
  }
  if (!best.solution.isGround && best.freedom.B) {
    warnings.push(
      `with these parameters the ground level has another spin than ${best.solution.groundLabel}: the bands do not fit that spin state`,
    );
  }
  if (best.solution.status === 'at bound') warnings.push('a parameter ran into the end of its range');
  for (const [i, band] of bands.entries()) {
    const off = band.energy_cm1 - best.solution.predicted[i]!;
    if (Math.abs(off) > Math.max(4 * band.se_cm1, 0.05 * band.energy_cm1)) {
      warnings.push(
        `the band at ${band.energy_cm1} cm-1 is ${Math.round(Math.abs(off))} cm-1 ${off > 0 ? 'above' : 'below'} its level`,
      );
    }
  }
  const rival = account.trials.find(
    (trial) => trial !== best && trial.cost < best.cost + 2 && trial.solution.isGround,
  );
  if (
    rival !== undefined &&
    !(
      rival.freedom.B === false &&
      best.freedom.B === false &&
      rival.groundMultiplicity === best.groundMultiplicity
    )
  ) {
    const name = labelOf(rival, request);
    warnings.push(
      `another assignment fits nearly as well: ${rival.levels.map(name).join(', ')} with 10Dq ${Math.round(rival.solution.parameters.tenDq)}, B ${Math.round(rival.solution.parameters.B)}; labels would settle it`,
    );
  }
  return warnings;
}

/** Puts a fit into words and numbers for a person. */
export function describeFit(account: Account): FieldFit {
  const { request, bands, best, trials } = account;
  const { solution, freedom } = best;
  const fitted = (freedom.B ? 2 : 1) + (freedom.C === 'free' ? 1 : 0);
  const degreesOfFreedom = bands.length - fitted;
  // Scatter larger than the stated uncertainties widens the standard errors (R. T. Birge, Phys. Rev. 40, 207, 1932).
  const scale = degreesOfFreedom > 0 ? Math.max(1, Math.sqrt(solution.chi2 / degreesOfFreedom)) : 1;
  const parameter = (name: 'tenDq' | 'B' | 'C', status: FittedParameter['status']): FittedParameter => {
    const se = solution.rawSe[name];
    if (status === 'not determined') return { value: null, se: null, status };
    return {
      value: solution.parameters[name],
      se: status === 'fitted' && se !== null ? se * scale : null,
      status,
    };
  };
  const dependsOnC = feels(best, request, 'C');
  const bStatus = freedom.B ? 'fitted' : feels(best, request, 'B') ? 'held' : 'not determined';
  const cStatus =
    freedom.C === 'free' ? 'fitted' : dependsOnC ? (freedom.B ? 'tied to B' : 'held') : 'not determined';
  const name = labelOf(best, request);
  const remarks: string[] = [];
  const assumed = request.bands.filter((band) => band.se_cm1 == null).length;
  if (assumed > 0)
    remarks.push(
      `${assumed} of ${bands.length} bands without an uncertainty: 1 % of the position assumed, as published maxima of broad bands agree`,
    );
  if (scale > 1.5)
    remarks.push(
      `the bands scatter ${scale.toFixed(1)} times as much as their uncertainties; the standard errors are widened by that`,
    );
  const shared = best.levels.filter(
    (key, i) => best.levels.findIndex((other) => sameLevel(key, other)) < i,
  ).length;
  if (shared > 0) {
    remarks.push(
      `${shared} ${shared === 1 ? 'band shares its level' : 'bands share their level'} with another: components of a level that a lower symmetry splits, of which the fit takes the mean`,
    );
  }
  if (degreesOfFreedom === 0)
    remarks.push(
      'as many bands as parameters: the fit is exact and says nothing about whether the model holds',
    );
  return {
    tenDq: parameter('tenDq', 'fitted'),
    B: parameter('B', bStatus),
    C: parameter('C', cStatus),
    orbitals: null,
    groundTerm: solution.groundLabel,
    assignment: bands.map((band, i) => ({
      energy_cm1: band.energy_cm1,
      calculated_cm1: solution.predicted[i]!,
      residual_cm1: band.energy_cm1 - solution.predicted[i]!,
      label: name(best.levels[i]!),
      multiplicity: best.levels[i]!.multiplicity,
    })),
    correlation: solution.correlation,
    rms_cm1: rms(bands, solution),
    chi2: solution.chi2,
    degreesOfFreedom,
    notDetermined: openQuestions(account),
    warnings: warningsOn(account, scale),
    remarks,
    alternatives: trials.slice(1, 6).map((trial) => ({
      tenDq: trial.solution.parameters.tenDq,
      B: trial.solution.parameters.B,
      C: trial.solution.parameters.C,
      labels: trial.levels.map(labelOf(trial, request)),
      groundTerm: trial.solution.groundLabel,
      rms_cm1: rms(bands, trial.solution),
      chi2: trial.solution.chi2,
    })),
    textbook: account.textbook,
  };
}
