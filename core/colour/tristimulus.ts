import { SpinhueError } from '../errors';
import {
  illuminantIds,
  illuminants,
  observerIds,
  observers,
  type IlluminantId,
  type ObserverId,
} from '../library/colourTables';

export type Triple = readonly [number, number, number];

/** How a colour is looked at. */
export interface Viewing {
  readonly illuminant?: IlluminantId;
  readonly observer?: ObserverId;
}

/** Average daylight and the observer for small fields: what a colour means where nothing else is said. */
export const defaultViewing: Required<Viewing> = { illuminant: 'D65', observer: '2deg' };

/** Illuminant times colour-matching functions, scaled so that the perfect transmitter has Y = 100. */
export interface ViewingWeights {
  readonly illuminant: IlluminantId;
  readonly observer: ObserverId;
  readonly x: Float64Array;
  readonly y: Float64Array;
  readonly z: Float64Array;
  /** XYZ of the perfect transmitter or diffuser, summed over the same grid. */
  readonly white: Triple;
}

const sum = (values: Float64Array): number => values.reduce((total, value) => total + value, 0);

function weigh(illuminant: IlluminantId, observer: ObserverId): ViewingWeights {
  const { power } = illuminants[illuminant];
  const matching = observers[observer];
  const scale = 100 / power.reduce((total, value, index) => total + value * matching.y[index]!, 0);
  const weights = (column: readonly number[]): Float64Array =>
    Float64Array.from(column, (value, index) => scale * value * power[index]!);
  const [x, y, z] = [weights(matching.x), weights(matching.y), weights(matching.z)];
  return { illuminant, observer, x, y, z, white: [sum(x), sum(y), sum(z)] };
}

function requireKnown(field: string, found: string, known: readonly string[]): void {
  if (known.includes(found)) return;
  throw new SpinhueError({
    code: 'unknown-field-value',
    field,
    message: `${field} is ${JSON.stringify(found)}`,
    remedy: `give one of ${known.join(', ')}`,
  });
}

const kept = new Map<string, ViewingWeights>();

/** Weight table of an illuminant and an observer (D65 and 2 degrees unless said), made once. Throws `unknown-field-value`. */
export function viewingWeights(viewing: Viewing = {}): ViewingWeights {
  const { illuminant, observer } = { ...defaultViewing, ...viewing };
  const key = `${illuminant}/${observer}`;
  const known = kept.get(key);
  if (known !== undefined) return known;
  requireKnown('illuminant', illuminant, illuminantIds);
  requireKnown('observer', observer, observerIds);
  const made = weigh(illuminant, observer);
  kept.set(key, made);
  return made;
}

/**
 * XYZ (Y = 100 for the perfect transmitter) of light that passed a sample: plain sums over 380 to 780 nm in steps of
 * 5 nm. CIE 15:2004, section 7.
 *
 * @param passed - transmittance or reflectance, 0 to 1, on the visible grid
 * @param out - of length 3; written at `at`
 */
export function tristimulusInto(
  passed: ArrayLike<number>,
  weights: ViewingWeights,
  out: Float64Array,
  at = 0,
): void {
  const { x, y, z } = weights;
  let X = 0;
  let Y = 0;
  let Z = 0;
  for (let point = 0; point < x.length; point++) {
    const share = passed[point]!;
    X += share * x[point]!;
    Y += share * y[point]!;
    Z += share * z[point]!;
  }
  out[at] = X;
  out[at + 1] = Y;
  out[at + 2] = Z;
}

export function tristimulus(passed: ArrayLike<number>, weights: ViewingWeights): Triple {
  const out = new Float64Array(3);
  tristimulusInto(passed, weights, out);
  return [out[0]!, out[1]!, out[2]!];
}

/** Chromaticity x, y; that of the white where there is no light at all. */
export function chromaticity([X, Y, Z]: Triple, white: Triple): readonly [number, number] {
  const total = X + Y + Z;
  return total > 0 ? [X / total, Y / total] : chromaticity(white, white);
}
