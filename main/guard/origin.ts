/**
 * Where the page lives. Frozen for good: the project database belongs to this origin, and under another name every
 * record would be out of sight.
 */
export const scheme = 'spinhue';
export const host = 'workbench';
export const startUrl = `${scheme}://${host}/index.html`;

/** The one test of whether an address is ours. */
export function isOurUrl(address: string): boolean {
  let url: URL;
  try {
    url = new URL(address);
  } catch {
    return false;
  }
  return (
    url.protocol === `${scheme}:` &&
    url.hostname === host &&
    url.port === '' &&
    url.username === '' &&
    url.password === ''
  );
}
