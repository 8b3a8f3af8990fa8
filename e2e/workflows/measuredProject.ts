import { fitField } from '../../core/measured/fieldFit/fitField';
import { defaultLibrary, findIon } from '../../core/library';
import { estimateField } from '../../core/estimation';
import { predict, type Prediction } from '../../core/prediction';
import type { Analysis } from '../../core/record/analysis';
import { writeBundle } from '../../core/record/bundle';
import type { Composition } from '../../core/record/composition';
import { type Measurement, type MeasurementContent, noConditions } from '../../core/record/measurement';
import type { Candidate, FrozenPrediction, Project } from '../../core/record/project';
import { seeded } from '../../core/testing/seeded';

const at = '2026-03-01T09:00:00.000Z';
const dated = (id: string) => ({ id, revision: 0, createdAt: at, updatedAt: at, deletedAt: null });

const octahedral = (metal: string, oxidationState: number, ligands: Record<string, number>): Composition => ({
  metal,
  oxidationState,
  geometry: 'octahedral',
  ligands,
  isomer: null,
});
/** How much stronger imidazole is in the made-up laboratory than the library, which goes by its class, takes it for. */
const stronger = 1.12;
const chromium = octahedral('Cr', 3, { im: 6 });
const inLibrary =
  estimateField(chromium, defaultLibrary)!.fields.middle.value! / defaultLibrary.ions.get('Cr3+')!.g.value!;
const world = {
  values: { 'ligand.im.f': { value: stronger * inLibrary, sigma: 0.01, source: 'made up' } },
};

const measuredComplexes = [
  chromium,
  octahedral('Cr', 3, { im: 4, h2o: 2 }),
  octahedral('V', 3, { im: 6 }),
  octahedral('V', 3, { im: 3, h2o: 3 }),
  octahedral('Cr', 3, { im: 3, cl: 3 }),
  octahedral('V', 3, { im: 3, cl: 3 }),
];
/** Never measured, but with the ligand that the record teaches about. */
const relative = octahedral('Co', 2, { im: 6 });
const ironComplexes = [octahedral('Fe', 2, { im: 6 }), octahedral('Fe', 2, { phen: 3 })];

function predicted(composition: Composition, id: string, parameterSet: typeof world | null): Prediction {
  const outcome = predict({ ...composition, id, concentration_mM: 10, path_cm: 1 }, { parameterSet });
  if (!outcome.ok) throw new Error(outcome.problems[0]!.message);
  return outcome.prediction;
}

/**
 * A made-up project in which six complexes of imidazole absorb where a ligand stronger by 12 % puts them, each with
 * assigned bands and a fitted field, and the moments of two iron(II) complexes are known. Predictions were frozen before.
 */
export function measuredProject(name: string): string {
  const random = seeded(11);
  // Two such projects must not share a row.
  const row = (id: string) => dated(`${name} ${id}`);
  const project: Project = {
    ...row('measured'),
    name,
    notes: 'Made up: no such series was measured.',
    demo: false,
    targetLab: null,
    parameterSetId: null,
  };
  const candidates: Candidate[] = [];
  const frozenPredictions: FrozenPrediction[] = [];
  const measurements: Measurement[] = [];
  const analyses: Analysis[] = [];
  const measure = (id: string, content: MeasurementContent): void =>
    void measurements.push({
      ...row(`m-${id}`),
      projectId: project.id,
      candidateId: row(id).id,
      sampleId: null,
      frozenPredictionId: row(`f-${id}`).id,
      revisions: [{ number: 0, at, by: 'MK', why: '', content }],
    });
  for (const [i, composition] of [...measuredComplexes, relative, ...ironComplexes].entries()) {
    const id = `c${i}`;
    candidates.push({
      ...row(id),
      projectId: project.id,
      name: '',
      composition,
      counterIon: null,
      solvate: null,
      concentration_mM: 10,
      path_cm: 1,
      tags: [],
      starred: false,
      archived: false,
      notes: '',
    });
    const prediction = predicted(composition, row(id).id, null);
    frozenPredictions.push({
      ...row(`f-${id}`),
      projectId: project.id,
      candidateId: row(id).id,
      frozenAt: at,
      reason: 'before the series was made',
      parameterHash: prediction.madeWith.parameterHash,
      modelVersion: prediction.madeWith.modelVersion,
      prediction: JSON.parse(JSON.stringify(prediction)) as Record<string, unknown>,
    });
    const conditions = { ...noConditions, date: '2026-03-10', solvent: 'water', operator: 'MK' };
    if (measuredComplexes.includes(composition)) {
      const allowed = (prediction: Prediction) =>
        prediction.bands
          .filter(({ kind }) => kind === 'spin-allowed')
          .sort((one, other) => one.energy_cm1 - other.energy_cm1);
      const there = allowed(predicted(composition, row(id).id, world));
      const bands = allowed(prediction).flatMap((band, k) => {
        const found = there[k];
        if (found?.label !== band.label || band.energy_cm1 > 40_000) return [];
        const value = Math.round(found.energy_cm1 * (1 + 0.004 * random.normal()));
        return [{ band, energy_cm1: { value, u: 100 } }];
      });
      measure(id, {
        kind: 'band list',
        conditions,
        remark: '',
        attachments: [],
        reportedIn: 'cm-1',
        bands: bands.map(({ energy_cm1 }) => ({
          energy_cm1,
          feature: 'maximum',
          molarAbsorptivity: { value: 12, u: 1 },
          width_cm1: 3000,
          note: '',
        })),
      });
      const { metal, oxidationState } = composition;
      const { dElectrons } = findIon(defaultLibrary, metal, oxidationState)!;
      const fit = fitField({
        dElectrons,
        geometry: 'octahedral',
        metal,
        oxidationState,
        bands: bands.map(({ band, energy_cm1 }) => ({
          energy_cm1: energy_cm1.value,
          se_cm1: energy_cm1.u,
          multiplicity: band.multiplicity,
          label: band.label,
        })),
      });
      analyses.push({
        ...row(`a-${id}`),
        projectId: project.id,
        measurementId: row(`m-${id}`).id,
        treatment: [],
        bandFit: null,
        assignment: bands.map(({ band, energy_cm1 }) => ({
          energy_cm1,
          label: band.label,
          multiplicity: band.multiplicity,
          predicted_cm1: band.energy_cm1,
          by: 'person',
        })),
        fieldFit: {
          dElectrons,
          geometry: 'octahedral',
          tenDq: fit.tenDq,
          B: fit.B,
          C: fit.C,
          rms_cm1: fit.rms_cm1,
          notDetermined: [...fit.notDetermined],
          warnings: [...fit.warnings],
        },
        notes: '',
      });
    }
    if (ironComplexes.includes(composition))
      measure(id, {
        kind: 'moment',
        conditions,
        remark: '',
        attachments: [],
        method: 'typed',
        readings: {},
        diamagnetism: { chi_cm3_mol: 0, basis: 'none' },
        moment_BM: { value: 'phen' in composition.ligands ? 0.4 : 5.3, u: 0.1 },
      });
  }
  return writeBundle({
    projects: [project],
    candidates,
    frozenPredictions,
    measurements,
    analyses,
  });
}
