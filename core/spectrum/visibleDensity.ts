import { fourLn2 } from './gaussian';
import { visibleWavenumbers_cm1 } from './visibleTransmission';

/**
 * The inner loops of clouds and search: bands added up on the visible grid and turned into light that passes. Both
 * exponentials come from tables with straight lines between their points (off by less than 2e-6).
 */
const places = visibleWavenumbers_cm1;
const first = places[0]!;
const last = places[places.length - 1]!;
/** The grid is even in wavelength. */
const from_nm = 1e7 / first;
const perStep = (places.length - 1) / (1e7 / last - from_nm);

const perWidth = 1024;
/** A Gaussian ends where it is below 1e-10, this many full widths from its centre. */
const gaussianReach = 2.9;
const gaussians = Float64Array.from({ length: Math.ceil(gaussianReach * perWidth) + 2 }, (_, index) =>
  Math.exp(-fourLn2 * (index / perWidth) ** 2),
);

const perDensity = 256;
/** Natural optical density beyond which no light is counted. */
const opaque = 20;
const shares = Float64Array.from({ length: opaque * perDensity + 2 }, (_, index) =>
  Math.exp(-index / perDensity),
);

/** A band that adds less than this to the natural optical density anywhere cannot be seen. */
const invisible = 3e-4;

/**
 * Adds a Gaussian band to a natural optical density on the visible grid.
 *
 * @param density - of length `visibleCount`
 * @param height - natural optical density at the centre
 */
export function addVisibleBand(
  density: Float64Array,
  centre_cm1: number,
  width_cm1: number,
  height: number,
): void {
  if (!(height > invisible)) return;
  const reach = width_cm1 * Math.min(gaussianReach, Math.sqrt(Math.log(height / invisible) / fourLn2));
  const highest = centre_cm1 + reach;
  const lowest = centre_cm1 - reach;
  if (highest < last || lowest > first) return;
  const start = highest >= first ? 0 : Math.ceil((1e7 / highest - from_nm) * perStep);
  const end = lowest <= last ? density.length : Math.ceil((1e7 / lowest - from_nm) * perStep);
  const scale = perWidth / width_cm1;
  for (let point = start; point < end; point++) {
    const away = (places[point]! - centre_cm1) * scale;
    const place = away < 0 ? -away : away;
    const below = place | 0;
    const before = gaussians[below]!;
    density[point] = density[point]! + height * (before + (gaussians[below + 1]! - before) * (place - below));
  }
}

/** Turns natural optical density into the share of the light that passes, in place. */
export function densityToTransmittance(density: Float64Array): void {
  for (let point = 0; point < density.length; point++) {
    const absorbed = density[point]!;
    if (absorbed >= opaque) {
      density[point] = 0;
      continue;
    }
    const place = absorbed * perDensity;
    const below = place | 0;
    const before = shares[below]!;
    density[point] = before + (shares[below + 1]! - before) * (place - below);
  }
}
