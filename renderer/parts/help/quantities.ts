/** What a quantity is, for somebody who meets it on a sheet. */
export interface QuantityHelp {
  readonly name: string;
  readonly what: string;
  readonly how: string;
  /** Published sources of the method; those of each value stand beside the value. */
  readonly source: string;
  readonly fails: string;
}

export const quantities = {
  tenDq: {
    name: '10Dq',
    what: 'How far the ligands split the d shell: the distance between its two sets of orbitals in an octahedral or tetrahedral field, always given as a positive size, in cm⁻¹.',
    how: 'A factor f for the ligand times a factor g for the metal ion, averaged over unlike ligands; times 4/9 in a tetrahedron. A measured complex, or a close relative of it, goes first where the library has one.',
    source:
      'C. K. Jørgensen, Absorption Spectra and Chemical Bonding in Complexes (1962) and Modern Aspects of Ligand Field Theory (1971); read second hand or recalled, see the library.',
    fails:
      'Cyanide, carbon monoxide, phosphanes and diimines on electron-rich ions; strong distortion; 4d and 5d ions on second-hand factors. For unlike ligands the average is only a centre: order and size of the splittings around it are uncertain.',
  },
  racahB: {
    name: 'B and C',
    what: 'Racah parameters: how strongly the d electrons repel one another, in cm⁻¹. Covalent bonds spread the electrons out and make both smaller than in the free ion.',
    how: 'B of the free ion times (1 − h k), h of the ligands and k of the metal. C keeps the ratio to B that the free ion has, or one that was measured.',
    source: 'G. Racah, Phys. Rev. 62 (1942) 438; nephelauxetic factors after C. K. Jørgensen (1962, 1971).',
    fails:
      'Soft ligands and high oxidation states, where the shell is no longer made of d orbitals alone. One B for both sets of orbitals is itself an approximation.',
  },
  zeta: {
    name: 'ζ',
    what: 'Spin-orbit parameter of one d electron, in cm⁻¹: it splits terms and lends strength to spin-forbidden bands.',
    how: 'The value of the free ion, lowered with B.',
    source: 'J. S. Griffith, The Theory of Transition-Metal Ions (1961); recalled.',
    fails: 'It is left out of the screening levels; for 4d and 5d ions that matters, and the sheet says so.',
  },
  spin: {
    name: 'Spin state',
    what: 'Whether the d electrons stay unpaired (high spin) or pair up in the lower orbitals (low spin), as a probability under the stated doubts.',
    how: 'The exact lowest levels of both multiplicities are compared, each at its own metal-ligand distance, with the entropy in favour of high spin at the stated temperature; the doubts about 10Dq, B and C are carried through.',
    source: 'Y. Tanabe, S. Sugano, J. Phys. Soc. Jpn. 9 (1954) 753 and 766, by full diagonalisation.',
    fails:
      'Near the crossover nobody can tell from a field estimate: the program then says so and gives a span of temperatures, never one. Counter-ion, solvate and packing decide in the solid.',
  },
  moment: {
    name: 'Magnetic moment',
    what: 'Effective moment at room temperature in Bohr magnetons.',
    how: 'The spin-only value √(n(n+2)) for n unpaired electrons; beside it the range found for such ions.',
    source: 'B. N. Figgis, J. Lewis, Prog. Inorg. Chem. 6 (1964) 37, recalled, for the ranges.',
    fails: 'T ground terms, where the orbit adds to the spin; coupled centres; mixtures of spin states.',
  },
  band: {
    name: 'Band centre and width',
    what: 'Where a transition absorbs, and how broad it is at half its height. A width in nm is the width in cm⁻¹ converted at that centre.',
    how: 'Energies are exact levels for the estimated 10Dq, B and C; the range carries their doubts and what such levels were off by. Charge transfer comes from optical electronegativities.',
    source:
      'Y. Tanabe, S. Sugano (1954); optical electronegativities after C. K. Jørgensen, Prog. Inorg. Chem. 12 (1970) 101, recalled.',
    fails:
      'Shoulders, vibrational structure, solvent and ion-pair shifts are left out. Charge transfer may bury d–d bands.',
  },
  strength: {
    name: 'ε',
    what: 'Molar absorptivity at the centre of a band, in L mol⁻¹ cm⁻¹.',
    how: 'By the selection rules alone: spin, parity, centre of symmetry. The range, a factor of three and more to each side, should hold 95 % of complexes.',
    source: 'A. B. P. Lever, Inorganic Electronic Spectroscopy (1984), typical strengths, recalled.',
    fails: 'Always rough; intensity borrowed from charge transfer can be ten times more.',
  },
  colour: {
    name: 'Seen colour',
    what: 'The light that is left after the solution, as L*a*b* and in words, under a named light, observer, concentration and path.',
    how: 'Gaussian bands, Beer-Lambert, colour-matching functions; then again for many draws from the doubts, which gives the share of each colour word.',
    source: 'CIE 15 (colorimetry); differences by CIEDE2000 (Sharma, Wu, Dalal 2005).',
    fails:
      'One swatch says too much: read the share of words. Strong charge transfer near the visible decides the colour and is the least certain band. A screen cannot show every colour.',
  },
} as const satisfies Readonly<Record<string, QuantityHelp>>;

export type QuantityId = keyof typeof quantities;
export const quantityIds = Object.keys(quantities) as readonly QuantityId[];
