import {
  inversion,
  properRotation as C,
  reflection as sigma,
  rotoreflection as S,
  type Operation,
} from './operation';

/**
 * How the groups stand, as in the published tables (Altmann and Herzig 1994; Cotton, Chemical Applications of Group
 * Theory): principal axis z; C2' along x; σv holds x (σ(xz) in C_2v); in D_nd C2' along x, so the mirror planes of D_2d
 * are at 45°; cubic axes x, y, z, and S4 along them in T_d.
 */
export type Family =
  | 'cyclic'
  | 'pyramidal'
  | 'reflection'
  | 'dihedral'
  | 'prismatic'
  | 'antiprismatic'
  | 'rotoreflection'
  | 'cubic';

export interface GroupRecipe {
  readonly name: string;
  readonly family: Family;
  /** Order of the principal axis (of the improper one where it decides the names: S_2n of D_nd with n even, S_4). */
  readonly order: number;
  readonly generators: readonly Operation[];
  /** The operation whose character tells A from B. */
  readonly principal: Operation | null;
  /** The operation whose character tells subscript 1 from 2. */
  readonly secondary: Operation | null;
}

function axial(n: number): GroupRecipe[] {
  const Cn = C(n);
  const principal = Cn;
  const C2x = C(2, 'x');
  const sigmaV = sigma('y');
  const sigmaH = sigma('z');
  const recipe = (
    name: string,
    family: Family,
    generators: readonly Operation[],
    secondary: Operation | null,
    main: Operation = principal,
    order = n,
  ): GroupRecipe => ({ name, family, order, generators, principal: main, secondary });
  const evenD = n % 2 === 0;
  return [
    recipe(`C${n}`, 'cyclic', [Cn], null),
    recipe(`C${n}v`, 'pyramidal', [Cn, sigmaV], sigmaV),
    recipe(`C${n}h`, 'reflection', [Cn, sigmaH], null),
    recipe(`D${n}`, 'dihedral', [Cn, C2x], C2x),
    recipe(`D${n}h`, 'prismatic', [Cn, C2x, sigmaH], C2x),
    evenD
      ? recipe(`D${n}d`, 'antiprismatic', [S(2 * n), C2x], C2x, S(2 * n), 2 * n)
      : recipe(`D${n}d`, 'antiprismatic', [Cn, C2x, inversion], C2x),
  ];
}

const small = (
  name: string,
  family: Family,
  order: number,
  generators: readonly Operation[],
  principal: Operation | null = null,
): GroupRecipe => ({ name, family, order, generators, principal, secondary: null });

const cubic = (name: string, generators: readonly Operation[], secondary: Operation | null): GroupRecipe => ({
  name,
  family: 'cubic',
  order: secondary === null ? 3 : 4,
  generators: [C(3, [1, 1, 1]), ...generators],
  principal: null,
  secondary,
});

/** Every point group that occurs in a complex of coordination number up to 9, except the icosahedral and the linear ones. */
export const groupRecipes: readonly GroupRecipe[] = [
  small('C1', 'cyclic', 1, []),
  small('Ci', 'rotoreflection', 1, [inversion]),
  small('Cs', 'reflection', 1, [sigma('z')]),
  ...[2, 3, 4, 5, 6].flatMap(axial),
  small('S4', 'rotoreflection', 4, [S(4)], S(4)),
  small('S6', 'rotoreflection', 3, [C(3), inversion], C(3)),
  small('S8', 'rotoreflection', 8, [S(8)], S(8)),
  cubic('T', [C(2)], null),
  cubic('Th', [C(2), inversion], null),
  cubic('Td', [S(4)], S(4)),
  cubic('O', [C(4)], C(4)),
  cubic('Oh', [C(4), inversion], C(4)),
];
