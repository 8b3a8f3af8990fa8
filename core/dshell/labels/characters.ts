import { turned, type PointGroup, type Quaternion } from '../../symmetry';
import { carriedBy, type Amplitudes } from '../states/amplitudes';

/** Real part of ⟨a|b⟩ of two states over the same multiplets. */
export function overlap(a: Amplitudes, b: Amplitudes): number {
  let sum = 0;
  a.re.forEach((re, which) => {
    const [x, y, im] = [b.re[which]!, b.im[which]!, a.im[which]!];
    for (let at = 0; at < re.length; at++) sum += re[at]! * x[at]! + im[at]! * y[at]!;
  });
  return sum;
}

/** Σ over states of ⟨ψ|R|ψ⟩ for one rotation of each class: real parts, which is all that joined classes need. */
export type CharacterReader = (states: readonly Amplitudes[]) => number[];

/** Reads characters of sets of states given in the laboratory; `frame` carries the group's standard axes from the laboratory's. */
export function characterReader(group: PointGroup, frame: Quaternion): CharacterReader {
  const turns = group.classes.map(({ representative }) => carriedBy(turned(representative, frame).rotation));
  return (states) => turns.map((turn) => states.reduce((sum, state) => sum + overlap(state, turn(state)), 0));
}
