import type { DoubtShare, Estimate, Reason } from './types';

/** What a cause of doubt is called in a sentence; null where another line of the account tells it already. */
function nameOf(cause: string): string | null {
  const [kind, ...rest] = cause.split(':');
  const subject = rest.join(' with ');
  switch (kind) {
    case 'f':
      return `f of ${subject}`;
    case 'g':
      return `g of ${subject}`;
    case 'anchor':
      return `the value measured on ${subject}`;
    case 'factorisation':
      return `that 10Dq factorises into f and g (${subject})`;
    case 'h':
      return `h of ${subject}`;
    case 'k':
      return `k of ${subject}`;
    case 'B0':
      return `free-ion B of ${subject}`;
    case 'nephelauxetic':
      return 'the rule B = B0 (1 - h k) itself';
    default:
      return null;
  }
}

const mostNamed = 3;

/** The largest doubts of an estimate that its account does not name yet, largest first. */
export function doubtReasons(shares: readonly DoubtShare[]): Reason[] {
  return shares
    .toSorted((a, b) => Math.abs(b.sigma) - Math.abs(a.sigma))
    .slice(0, mostNamed)
    .flatMap(({ cause, sigma }): Reason[] => {
      const name = nameOf(cause);
      return name === null ? [] : [{ kind: 'doubt', text: name, sigma: Math.abs(sigma) }];
    });
}

/** The one measurement that would settle 10Dq of such an ion. */
export function settlingMeasurement(dElectrons: number, lowSpin: boolean): string {
  if (dElectrons === 5)
    return lowSpin ? 'a relative with another metal' : 'its spin-forbidden bands, with B and C';
  if (dElectrons === 2 || dElectrons === 7)
    return 'its first two spin-allowed bands: 10Dq is nearly their difference';
  if (dElectrons === 6 && lowSpin) return 'its 1T1g and 1T2g bands: 10Dq is the first plus about C';
  return 'its first spin-allowed band, which is 10Dq';
}

/** The estimate with its largest doubts and what would settle it added to the account. */
export const withAccount = (estimate: Estimate, settle: string): Estimate =>
  estimate.value === null
    ? estimate
    : {
        ...estimate,
        reasons: [
          ...estimate.reasons.filter(({ kind }) => kind !== 'settle'),
          ...doubtReasons(estimate.shares ?? []),
          ...(estimate.route === 'measured-complex' ? [] : [{ kind: 'settle' as const, text: settle }]),
          ...estimate.reasons.filter(({ kind }) => kind === 'settle'),
        ],
      };
