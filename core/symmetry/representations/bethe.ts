/**
 * Bethe numbers Γ1, Γ2, ... of the representations, in the order of G. F. Koster, J. O. Dimmock, R. G. Wheeler and
 * H. Statz, Properties of the Thirty-Two Point Groups, MIT Press 1963 (from memory). Those joined by time reversal
 * share an entry and are written `G5+G6`. A group with inversion is numbered as its rotations, with the parity apart.
 */
const order: Readonly<Record<string, string>> = {
  C1: 'A A1/2',
  C2: 'A B E1/2:2',
  Cs: "A' A'' E1/2:2",
  C3: 'A E:2 E1/2:2 A3/2',
  C4: 'A B E:2 E1/2:2 E3/2:2',
  S4: 'A B E:2 E1/2:2 E3/2:2',
  D2: 'A B2 B1 B3 E1/2',
  C2v: 'A1 B1 A2 B2 E1/2',
  D3: 'A1 A2 E E1/2 E3/2:2',
  C3v: 'A1 A2 E E1/2 E3/2:2',
  D4: 'A1 A2 B1 B2 E E1/2 E3/2',
  C4v: 'A1 A2 B1 B2 E E1/2 E3/2',
  D2d: 'A1 A2 B1 B2 E E1/2 E3/2',
  D6: 'A1 A2 B1 B2 E1 E2 E1/2 E5/2 E3/2',
  C6v: 'A1 A2 B1 B2 E1 E2 E1/2 E5/2 E3/2',
  D3h: "A1' A2' A1'' A2'' E'' E' E1/2 E5/2 E3/2",
  T: 'A E:2 T E1/2 F3/2:2',
  O: 'A1 A2 E T1 T2 E1/2 E5/2 F3/2',
  Td: 'A1 A2 E T1 T2 E1/2 E5/2 F3/2',
};

/** The group of rotations of a group that holds the inversion. */
const rotations: Readonly<Record<string, string>> = {
  ...{ Ci: 'C1', C2h: 'C2', C4h: 'C4', S6: 'C3' },
  ...{ D2h: 'D2', D3d: 'D3', D4h: 'D4', D6h: 'D6', Th: 'T', Oh: 'O' },
};

/** `G4`, or null for groups outside the thirty-two or not listed here. `stem` is the Mulliken name without g and u. */
export function betheName(group: string, stem: string): string | null {
  const names = order[rotations[group] ?? group];
  if (names === undefined) return null;
  let number = 1;
  for (const entry of names.split(' ')) {
    const [name, count = '1'] = entry.split(':');
    if (name === stem) return count === '1' ? `G${number}` : `G${number}+G${number + 1}`;
    number += Number(count);
  }
  return null;
}
