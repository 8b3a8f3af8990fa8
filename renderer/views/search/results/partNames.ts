const names: Readonly<Record<string, string>> = {
  bands: 'absorbs',
  clear: 'lets through',
  spin: 'spin',
  unpaired: 'unpaired electrons',
  moment_BM: 'moment',
  tenDq_cm1: '10Dq',
  colour: 'colour',
  emission: 'emission',
};

/** `bands[1]` as the form calls it: `absorbs (2)`; the first of its kind goes without a number. */
export function partName(part: string): string {
  const [, kind, place] = /^(\w+)(?:\[(\d+)\])?$/.exec(part) ?? [];
  const name = names[kind ?? ''] ?? part;
  return place === undefined || place === '0' ? name : `${name} (${Number(place) + 1})`;
}
