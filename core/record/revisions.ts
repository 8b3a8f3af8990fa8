import { SpinhueError } from '../errors';
import { canonicalJson } from './canonicalJson';
import type { Measurement, MeasurementContent, Revision } from './measurement';

/** The state of a measurement that counts. */
export const currentContent = (measurement: Measurement): MeasurementContent =>
  measurement.revisions.at(-1)!.content;

/**
 * A corrected measurement: the former states stay, the correction comes after them. Throws a SpinhueError where the
 * reason is empty or the kind of measurement would change.
 */
export function correctMeasurement(
  measurement: Measurement,
  correction: Pick<Revision, 'at' | 'by' | 'why' | 'content'>,
): Measurement {
  if (correction.why.trim() === '') {
    throw new SpinhueError({
      code: 'missing-field',
      message: 'a correction needs its reason',
      field: 'why',
      remedy: 'say in a few words why the entry is corrected',
    });
  }
  if (correction.content.kind !== currentContent(measurement).kind) {
    throw new SpinhueError({
      code: 'unknown-field-value',
      message: `a ${currentContent(measurement).kind} cannot be corrected into a ${correction.content.kind}`,
      field: 'content.kind',
      remedy: 'add a new measurement and move this one to the bin',
    });
  }
  return {
    ...measurement,
    revision: measurement.revision + 1,
    updatedAt: correction.at,
    revisions: [...measurement.revisions, { number: measurement.revisions.length, ...correction }],
  };
}

/** Whether `later` holds every revision of `earlier` unchanged: the only change a measurement's history allows. */
export function continuesHistory(
  earlier: Pick<Measurement, 'revisions'>,
  later: Pick<Measurement, 'revisions'>,
): boolean {
  return earlier.revisions.every(
    (revision, i) =>
      later.revisions[i] !== undefined && canonicalJson(revision) === canonicalJson(later.revisions[i]),
  );
}
