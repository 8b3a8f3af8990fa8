import { HostError } from '../../renderer/host/hostError';
import { externalLinks } from '../../renderer/host/links';

/**
 * The address behind an id of the fixed table.
 *
 * @throws {HostError} `refused` for anything else, an address included
 */
export function addressOf(link: string): string {
  if (!Object.hasOwn(externalLinks, link)) {
    throw new HostError({
      code: 'refused',
      message: `"${link.slice(0, 80)}" is not one of the program's own links.`,
      remedy: 'Copy the address and open it in a browser if you trust it.',
    });
  }
  return externalLinks[link as keyof typeof externalLinks].url;
}
