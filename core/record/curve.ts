import { z } from 'zod';
import { contentHash } from './hash';
import { sha256Schema } from './uncertain';

export const xUnits = ['nm', 'cm-1', 'unknown'] as const;
export const yUnits = [
  'absorbance',
  'transmittance',
  'percent-transmittance',
  'molar-absorptivity',
  'unknown',
] as const;
export type XUnit = (typeof xUnits)[number];
export type YUnit = (typeof yUnits)[number];

/** The numbers of one spectrum: x ascending, y null where a point is saturated or missing. */
export interface CurveData {
  readonly kind: 'curve' | 'peaks';
  readonly xUnit: XUnit;
  readonly yUnit: YUnit;
  readonly x: readonly number[];
  readonly y: readonly (number | null)[];
}

/**
 * A spectrum as read, known by the hash of its numbers and therefore never changed: a correction of the units or of a
 * point is another curve.
 */
export const curveSchema = z
  .strictObject({
    id: sha256Schema,
    kind: z.enum(['curve', 'peaks']),
    xUnit: z.enum(xUnits),
    yUnit: z.enum(yUnits),
    x: z.array(z.number()).min(1).max(1_000_000),
    y: z.array(z.number().nullable()).min(1).max(1_000_000),
  })
  .refine((curve) => curve.x.length === curve.y.length, {
    message: 'x and y differ in length',
    path: ['y'],
  });
export type Curve = z.infer<typeof curveSchema>;

const numbersOf = (data: CurveData): CurveData => ({
  kind: data.kind,
  xUnit: data.xUnit,
  yUnit: data.yUnit,
  x: data.x,
  y: data.y,
});

/** The curve as a row: its id follows from its numbers and units. */
export const curveRow = (data: CurveData): Curve => ({
  id: contentHash(numbersOf(data)),
  kind: data.kind,
  xUnit: data.xUnit,
  yUnit: data.yUnit,
  x: [...data.x],
  y: [...data.y],
});

/** Whether the id of a stored curve still fits its numbers. */
export const isIntactCurve = (curve: Curve): boolean => contentHash(numbersOf(curve)) === curve.id;
