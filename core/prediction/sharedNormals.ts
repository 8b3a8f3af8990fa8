/**
 * Standard normal numbers named by a cause of doubt: the same name gives the same numbers everywhere and always. Two
 * candidates that share a ligand are therefore drawn together, and a prediction made again has the same cloud.
 */
const kept = new Map<string, Float64Array>();
const mostKept = 4000;

/** FNV-1a, 32 bit (G. Fowler, L. C. Noll, K.-P. Vo). */
function hashOf(text: string): number {
  let hash = 0x811c9dc5;
  for (let i = 0; i < text.length; i++) hash = Math.imul(hash ^ text.charCodeAt(i), 0x01000193);
  return hash >>> 0;
}

/** splitmix32: one 32-bit state, period 2^32; more than enough for a few hundred draws per name. */
function uniforms(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x9e3779b9) | 0;
    let z = state ^ (state >>> 16);
    z = Math.imul(z, 0x21f0aaad);
    z ^= z >>> 15;
    z = Math.imul(z, 0x735a2d97);
    return ((z ^ (z >>> 15)) >>> 0) / 4294967296;
  };
}

/** `count` standard normals of that name (Box and Muller 1958). The array is shared: do not change it. */
export function sharedNormals(name: string, count: number): Float64Array {
  const known = kept.get(name);
  if (known !== undefined && known.length >= count) return known;
  const next = uniforms(hashOf(name));
  const values = new Float64Array(count + (count % 2));
  for (let i = 0; i < values.length; i += 2) {
    const radius = Math.sqrt(-2 * Math.log(1 - next()));
    const angle = 2 * Math.PI * next();
    values[i] = radius * Math.cos(angle);
    values[i + 1] = radius * Math.sin(angle);
  }
  if (kept.size >= mostKept) kept.clear();
  kept.set(name, values);
  return values;
}
