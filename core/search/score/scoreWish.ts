import { colourDifference } from '../../colour';
import type { Prediction } from '../../prediction';
import type { Wish } from '../wish/wish';
import { chanceWithin } from './chance';
import { bandInWindow, clearInWindow } from './spectralParts';
import { chanceOfPredictedSpin, chanceOfSpin } from './spinParts';

/** How likely one part of a wish is to be met, and by what. */
export interface WishPart {
  /** Path into the wish: `bands[0]`, `spin`, `colour`. */
  readonly part: string;
  readonly probability: number;
  readonly because: string;
}

export interface WishScore {
  /** That the whole wish is met. */
  readonly probability: number;
  readonly parts: readonly WishPart[];
}

/** Whether a wish asks for something that only the bands can tell. */
export const wantsSpectrum = ({ bands, clear, colour, emission }: Wish): boolean =>
  (bands?.length ?? 0) > 0 || (clear?.length ?? 0) > 0 || colour !== undefined || emission !== undefined;

const whole = (value: number): string => String(Math.round(value));

function tenDqPart({ tenDq }: Prediction, { min, max }: { min: number; max: number }): WishPart {
  if (tenDq.value === null || tenDq.sigma === null) {
    return { part: 'tenDq_cm1', probability: 0, because: '10Dq is not estimated' };
  }
  return {
    part: 'tenDq_cm1',
    probability: chanceWithin(tenDq.value, tenDq.sigma, min, max),
    because: `10Dq ${whole(tenDq.value)} ± ${whole(tenDq.sigma)} cm-1`,
  };
}

function spinPart(prediction: Prediction, wish: Wish): WishPart {
  return {
    part: wish.spin === undefined ? 'unpaired' : 'spin',
    probability: chanceOfSpin(prediction, wish),
    because: prediction.spin.words,
  };
}

function momentPart({ spin }: Prediction, { min, max }: { min: number; max: number }): WishPart {
  const range = spin.momentRange_BM ?? [spin.momentSpinOnly_BM, spin.momentSpinOnly_BM];
  const [low, high] = [Math.max(min, range[0]), Math.min(max, range[1])];
  const span = range[1] - range[0];
  const share = span > 0 ? Math.max(0, high - low) / span : low <= high ? 1 : 0;
  return {
    part: 'moment_BM',
    probability: share,
    because: `${range[0]} to ${range[1]} Bohr magnetons usual`,
  };
}

function emissionPart({ bands }: Prediction, window: { from_nm: number; to_nm: number }): WishPart {
  const lowest = bands.find(({ kind }) => kind === 'spin-forbidden');
  const allowed = bands.find(({ kind }) => kind === 'spin-allowed');
  // Emission comes from the lowest excited level; where that is a spin-allowed one, there is no spin-flip line.
  if (lowest === undefined || (allowed !== undefined && allowed.energy_cm1 <= lowest.energy_cm1)) {
    return { part: 'emission', probability: 0, because: 'no spin-flip level lies lowest' };
  }
  return {
    part: 'emission',
    probability: chanceWithin(lowest.energy_cm1, lowest.sigma_cm1, 1e7 / window.to_nm, 1e7 / window.from_nm),
    because: `${lowest.label} at ${whole(lowest.wavelength_nm)} nm`,
  };
}

function colourPart({ cloud, colour }: Prediction, wanted: NonNullable<Wish['colour']>): WishPart {
  if (cloud === null || cloud.draws.length === 0) {
    return { part: 'colour', probability: 0, because: 'no colour is estimated' };
  }
  const met = cloud.draws.filter(({ lab }) => colourDifference(lab, wanted.lab) <= wanted.tolerance).length;
  return { part: 'colour', probability: met / cloud.draws.length, because: colour?.words ?? 'drawn colours' };
}

/**
 * Scores one prediction against a checked wish. The parts are taken as independent given the spin state; with a
 * spectral part the whole counts only the spin state that the bands were predicted for.
 */
export function scoreWish(prediction: Prediction, wish: Wish): WishScore {
  const spectral: WishPart[] = [
    ...(wish.bands ?? []).map((window, i): WishPart => {
      const { chance, band } = bandInWindow(prediction.bands, window);
      return {
        part: `bands[${i}]`,
        probability: chance,
        because: band === null ? 'no band' : `${band.label} at ${whole(band.wavelength_nm)} nm`,
      };
    }),
    ...(wish.clear ?? []).map((window, i): WishPart => {
      const known =
        prediction.bands.length > 0 || prediction.dElectrons === 0 || prediction.dElectrons === 10;
      return {
        part: `clear[${i}]`,
        probability: known ? clearInWindow(prediction.bands, window) : 0,
        because: known ? 'predicted bands' : 'no spectrum is estimated',
      };
    }),
    ...(wish.colour === undefined ? [] : [colourPart(prediction, wish.colour)]),
    ...(wish.emission === undefined ? [] : [emissionPart(prediction, wish.emission)]),
  ];
  const others: WishPart[] = [
    ...(wish.tenDq_cm1 === undefined ? [] : [tenDqPart(prediction, wish.tenDq_cm1)]),
    ...(wish.moment_BM === undefined ? [] : [momentPart(prediction, wish.moment_BM)]),
  ];
  const asksSpin = wish.spin !== undefined || wish.unpaired !== undefined;
  const spin = asksSpin ? [spinPart(prediction, wish)] : [];
  const ofSpin =
    spectral.length > 0 ? chanceOfPredictedSpin(prediction, wish) : asksSpin ? spin[0]!.probability : 1;
  const product = [...spectral, ...others].reduce((all, { probability }) => all * probability, ofSpin);
  return { probability: product, parts: [...spectral, ...others, ...spin] };
}
