/** Where one is: a view, inside a project or not, perhaps with one record in it. */
export interface Address {
  readonly view: string;
  readonly project: string | null;
  /** Id of the record that the view shows. */
  readonly item: string | null;
}

export const startAddress: Address = { view: 'start', project: null, item: null };

const decode = (part: string | undefined): string | null => {
  if (part === undefined || part === '') return null;
  try {
    return decodeURIComponent(part);
  } catch {
    return null;
  }
};

/** `#/candidates/in/PROJECT/ITEM` or `#/library`. Anything else is the start. */
export function parseAddress(hash: string): Address {
  const [view, second, third, fourth] = hash.replace(/^#\/?/, '').split('/');
  const name = decode(view);
  if (name === null) return startAddress;
  if (second === 'in') return { view: name, project: decode(third), item: decode(fourth) };
  return { view: name, project: null, item: decode(second) };
}

export function formatAddress({ view, project, item }: Address): string {
  const parts = [view, ...(project === null ? [] : ['in', project]), ...(item === null ? [] : [item])];
  return `#/${parts.map(encodeURIComponent).join('/')}`;
}
