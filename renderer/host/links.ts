/**
 * Every page on the web that the program can show, by id. Nothing else can be opened: the page hands over an id, never
 * an address.
 */
export const externalLinks = {
  'tanabe-sugano-1954': { title: 'Tanabe and Sugano (1954)', url: 'https://doi.org/10.1143/JPSJ.9.753' },
  'ciede2000-2005': { title: 'Sharma, Wu and Dalal (2005)', url: 'https://doi.org/10.1002/col.20070' },
  'iupac-gold-book': {
    title: 'IUPAC Compendium of Chemical Terminology',
    url: 'https://goldbook.iupac.org/',
  },
  codata: { title: 'CODATA values of the constants', url: 'https://physics.nist.gov/cuu/Constants/' },
} as const satisfies Readonly<Record<string, { readonly title: string; readonly url: string }>>;

export type LinkId = keyof typeof externalLinks;
