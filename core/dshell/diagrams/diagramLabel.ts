import { type FieldGroup } from '../adaptation/species';
import { rowLabel } from '../levels/labelGroup';

const linear: Readonly<Record<string, string>> = {
  '1': 'Π',
  '2': 'Δ',
  '3': 'Φ',
  '4': 'Γ',
  '5': 'H',
  '6': 'I',
};

/** Name of a row in a diagram: `4T2g`, `3Eg`, `G8`, `3Δg`. d electrons do not feel the inversion: all levels are g. */
export function diagramLabel(group: FieldGroup, species: string, multiplicity: number | null): string {
  const spinOrbit = multiplicity === null;
  const prefix = spinOrbit ? '' : String(multiplicity);
  switch (group) {
    case 'SO3':
      return prefix + rowLabel('SO3', species, spinOrbit);
    case 'O':
      return prefix + rowLabel('Oh', species, spinOrbit);
    case 'D4':
      return prefix + rowLabel('D4h', species, spinOrbit);
    case 'Dinf': {
      if (spinOrbit) return species.startsWith('|') ? `Ω=${species.slice(1, -1)}` : species.replace('Σ', '0');
      const name = species.startsWith('|') ? linear[species.slice(1, -1)]! : species;
      return `${prefix}${name.replace(/[+-]?$/, (sign) => `g${sign}`)}`;
    }
    default:
      return spinOrbit ? species : `${prefix}${species}g`;
  }
}
