import { clebschGordan } from '../angularMomentum/threeJ';
import { type Multiplet } from '../blocks/multiplets';
import { type Amplitudes } from '../states/amplitudes';

/**
 * Takes the spin out of a state with spin-orbit coupling, given over |(L S)J M⟩: one orbital state over |term L M_L⟩ for each
 * spin S and M_S. Their norms add up to 1.
 */
export function orbitalParts({ multiplets, re, im }: Amplitudes): Amplitudes[] {
  const found = new Map<string, Map<number, { multiplet: Multiplet; re: Float64Array; im: Float64Array }>>();
  multiplets.forEach(({ term, S, L, J }, which) => {
    for (let mS = -S; mS <= S; mS++) {
      const part = entry(found, `${S},${mS}`, () => new Map());
      const size = 2 * L + 1;
      const orbital = entry(part, term, () => ({
        ...{ multiplet: { term, S, L, J: L }, re: new Float64Array(size), im: new Float64Array(size) },
      }));
      for (let mL = Math.max(-L, -J - mS); mL <= Math.min(L, J - mS); mL++) {
        const factor = clebschGordan(L, mL, S, mS, J, mL + mS);
        orbital.re[mL + L]! += factor * re[which]![mL + mS + J]!;
        orbital.im[mL + L]! += factor * im[which]![mL + mS + J]!;
      }
    }
  });
  return [...found.values()].map((part) => {
    const orbitals = [...part.values()];
    return {
      multiplets: orbitals.map(({ multiplet }) => multiplet),
      re: orbitals.map((orbital) => orbital.re),
      im: orbitals.map((orbital) => orbital.im),
    };
  });
}

function entry<K, V>(map: Map<K, V>, key: K, make: () => V): V {
  let found = map.get(key);
  if (found === undefined) map.set(key, (found = make()));
  return found;
}
