import { algebraWidth, type OperatorName, type SymmetryBlock } from './symmetryBlocks';

/** Values of the parameters of a Hamiltonian, by the names of their operators; missing ones are zero. */
export type Parameters = ReadonlyMap<OperatorName, number>;

/**
 * Σ parameter · operator of one block, lower triangle, row-major, `width` numbers per element one after the other. `matrix`
 * may be longer than needed.
 */
export function assemble(
  block: SymmetryBlock,
  parameters: Parameters,
  matrix = new Float64Array(block.size * block.size * algebraWidth[block.species.algebra]),
): Float64Array {
  const width = algebraWidth[block.species.algebra];
  matrix.fill(0, 0, block.size * block.size * width);
  for (const [name, { places, values }] of block.operators) {
    const factor = parameters.get(name) ?? 0;
    if (factor === 0) continue;
    if (width === 1) {
      for (let e = 0; e < places.length; e++) matrix[places[e]!]! += factor * values[e]!;
      continue;
    }
    for (let e = 0, at = 0; e < places.length; e++) {
      const place = places[e]! * width;
      for (let component = 0; component < width; component++)
        matrix[place + component]! += factor * values[at++]!;
    }
  }
  return matrix;
}
