/**
 * Scratch vectors that are kept between calls: making a typed array costs more than solving a small matrix. The routines are
 * synchronous and use the vectors only while they run. Each vector is at least `length` long and holds leftovers.
 */
export function scratchVectors(count: number): (length: number) => readonly Float64Array[] {
  let vectors: Float64Array[] = [];
  let room = -1;
  return (length) => {
    if (length > room) {
      room = Math.max(16, length);
      vectors = Array.from({ length: count }, () => new Float64Array(room));
    }
    return vectors;
  };
}
