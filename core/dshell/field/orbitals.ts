/** Real d orbitals in the order used everywhere in the shell. */
export const dOrbitalNames = ['z2', 'x2-y2', 'xy', 'xz', 'yz'] as const;

const h = Math.SQRT1_2;
/**
 * ⟨m|real orbital⟩ for m = 2, 1, 0, −1, −2 (rows) with the phases of Condon and Shortley:
 * |±2⟩ = (x2-y2 ± i xy)/√2, |±1⟩ = ∓(xz ± i yz)/√2, |0⟩ = z2.
 */
export const realOrbitals: {
  readonly re: readonly (readonly number[])[];
  readonly im: readonly (readonly number[])[];
} = {
  re: [
    [0, h, 0, 0, 0],
    [0, 0, 0, -h, 0],
    [1, 0, 0, 0, 0],
    [0, 0, 0, h, 0],
    [0, h, 0, 0, 0],
  ],
  im: [
    [0, 0, -h, 0, 0],
    [0, 0, 0, 0, h],
    [0, 0, 0, 0, 0],
    [0, 0, 0, 0, h],
    [0, 0, h, 0, 0],
  ],
};
