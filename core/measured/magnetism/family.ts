import { accepted, refused, type Checked } from '../../errors';
import { fitLine, type LineFit } from '../../numerics/leastSquaresLine';

export interface FamilyMember {
  readonly name: string;
  /** Hammett's substituent constant, or whatever orders the family. */
  readonly sigma: number;
  /** Kelvin; null where the compound stays in one spin state over the whole range. */
  readonly half_K: number | null;
}

export interface FamilyTrend {
  readonly line: LineFit;
  readonly used: readonly FamilyMember[];
  readonly leftOut: readonly FamilyMember[];
  readonly caution: string;
}

/** Fewest compounds with a finite transition temperature that a trend is drawn through. */
export const leastMembers = 4;

/**
 * Transition temperatures of one family of compounds against a substituent constant, as a straight line with its
 * prediction interval. Refused for fewer than four finite temperatures: with three points any line looks good.
 */
export function familyTrend(members: readonly FamilyMember[]): Checked<FamilyTrend> {
  const used = members.filter((member) => member.half_K !== null);
  if (used.length < leastMembers) {
    return refused({
      code: 'out-of-range',
      field: 'members',
      message: `${used.length} finite transition temperatures; a trend needs at least ${leastMembers}`,
      remedy: 'measure more members of the family',
    });
  }
  const line = fitLine(
    used.map((member) => member.sigma),
    used.map((member) => member.half_K!),
  );
  if (line === null) {
    return refused({
      code: 'out-of-range',
      field: 'members',
      message: 'all members have the same substituent constant',
    });
  }
  return accepted({
    line,
    used,
    leftOut: members.filter((member) => member.half_K === null),
    caution:
      'holds inside this family, phase and counter-ion only; solvate and packing can move a transition by more than the line spans',
  });
}
