import { isomersOfComposition } from '../geometry/ligandSites';
import type { IonRecord, LigandRecord, ParameterLibrary } from '../library';
import type { Composition } from '../record/composition';
import { jahnTellerExpectation } from './jahnTeller';
import type { DonorShare } from './racah';
import type { Estimate, Flag } from './types';

const flag = (code: string, severity: Flag['severity'], message: string): Flag => ({
  code,
  severity,
  message,
});

/** f from which an acceptor other than a diimine or carbon donor is counted among the strong ones, as nitrite is. */
const strongAcceptor = 1.3;

const isDiimine = ({ piCharacter, denticity, donorAtoms }: LigandRecord): boolean =>
  piCharacter === 'acceptor' && denticity >= 2 && donorAtoms.every((atom) => atom === 'N');

function acceptorFlags(ion: IonRecord, ligands: readonly LigandRecord[]): Flag[] {
  const flags: Flag[] = [];
  const electronRich = ion.oxidationState <= 2 && ion.dElectrons >= 4 && ion.dElectrons <= 7;
  const names = (list: readonly LigandRecord[]): string =>
    list.map(({ commonName }) => commonName).join(', ');
  const carbon = ligands.filter(
    ({ donorAtoms, piCharacter }) => donorAtoms.includes('C') && piCharacter === 'acceptor',
  );
  const diimines = ligands.filter(isDiimine);
  const others = ligands.filter(
    (ligand) => ligand.piCharacter === 'acceptor' && !carbon.includes(ligand) && !diimines.includes(ligand),
  );
  if (carbon.length > 0 && electronRich) {
    flags.push(
      flag(
        'pi-acceptor-divalent',
        'invalid',
        `${names(carbon)} on ${ion.ion}: back donation is outside the model; spin state and bands are not to be trusted.`,
      ),
    );
  } else if (carbon.length > 0) {
    flags.push(
      flag(
        'pi-acceptor',
        'caution',
        `${names(carbon)}: one f cannot serve all metals; expect errors up to 15 %.`,
      ),
    );
  }
  if (diimines.length > 0 && electronRich) {
    flags.push(
      flag(
        'diimine-divalent',
        'invalid',
        `${names(diimines)} on ${ion.ion}: the field is stronger than f g says, and charge transfer rules the colour.`,
      ),
    );
  } else if (diimines.length > 0) {
    flags.push(flag('pi-acceptor', 'caution', `${names(diimines)} is a π acceptor: f depends on the metal.`));
  }
  const strong = others.filter(({ f }) => (f.value ?? 0) >= strongAcceptor);
  if (strong.length > 0 && electronRich) {
    flags.push(
      flag(
        'pi-acceptor-divalent',
        'invalid',
        `${names(strong)} on ${ion.ion}: back donation is outside the model; the spin state is not to be trusted.`,
      ),
    );
  }
  if (others.some(({ donorAtoms }) => donorAtoms.some((atom) => atom === 'P' || atom === 'As'))) {
    flags.push(
      flag(
        'pi-acceptor',
        'caution',
        `${names(others)}: the place of phosphanes and arsanes depends on the metal.`,
      ),
    );
  }
  return flags;
}

function ligandFlags(ligands: readonly LigandRecord[]): Flag[] {
  const flags: Flag[] = [];
  for (const { commonName, flags: marks } of ligands) {
    if (marks.includes('non-innocent')) {
      flags.push(
        flag(
          'non-innocent',
          'invalid',
          `${commonName} is non-innocent: oxidation state and d count are not certain.`,
        ),
      );
    }
    if (marks.includes('CT-dominated')) {
      flags.push(
        flag(
          'CT-dominated',
          'invalid',
          `With ${commonName} charge-transfer and ligand bands rule the spectrum.`,
        ),
      );
    }
    if (marks.includes('lattice-only')) {
      flags.push(
        flag(
          'lattice',
          'caution',
          'Oxide: 10Dq depends on the metal-oxygen distance of the site, here a mean.',
        ),
      );
    }
  }
  return flags;
}

/** Remarks that tell where the model is known to be weak or to fail for this composition. */
export function applicabilityFlags(
  composition: Composition,
  ion: IonRecord,
  parts: readonly DonorShare[],
  tenDq: Estimate,
  library: ParameterLibrary,
): Flag[] {
  const ligands = parts.map(({ ligand }) => ligand);
  const isomers = isomersOfComposition(composition, library);
  const flags = [...ligandFlags(ligands), ...acceptorFlags(ion, ligands)];
  if (!library.ions.has(ion.ion)) {
    flags.push(
      flag('unlisted-ion', 'caution', `${ion.ion} is not in the tables; only its d count is known.`),
    );
  }
  if (isomers.length === 0) {
    flags.push(
      flag(
        'chelate-span',
        'caution',
        `A chelate of this set cannot span ${composition.geometry} places without strain.`,
      ),
    );
  }
  if (ion.period !== '3d' && ion.dElectrons > 0 && ion.dElectrons < 10) {
    const zeta = ion.zeta0.value === null ? '' : ` (zeta about ${Math.round(ion.zeta0.value)} cm-1)`;
    flags.push(
      flag(
        'heavy-metal',
        'caution',
        `${ion.period} ion: spin-orbit coupling${zeta} shifts and splits the levels; low spin is the rule.`,
      ),
    );
  }
  if (tenDq.route === 'donor-class' || tenDq.route === 'series-place') {
    flags.push(
      flag('analogy', 'caution', '10Dq rests on analogy, not on a published value; its range is wide.'),
    );
  }
  if ((composition.isomer ?? null) === null && isomers.length > 1) {
    const named = isomers.flatMap(({ name }) => name ?? []);
    flags.push(
      flag(
        'isomer-not-named',
        'note',
        `This set has ${isomers.length} isomers (${named.slice(0, 4).join(', ')}); none is named, so the answer is for their common mean.`,
      ),
    );
  }
  if (parts.length > 1) {
    flags.push(
      flag(
        'average-environment',
        'note',
        'Mixed ligands: 10Dq is the average environment; size and order of the splitting are not always predictable.',
      ),
    );
  }
  if (ion.oxidationState >= 5 && ligands.some(({ id }) => id === 'oxo')) {
    flags.push(
      flag(
        'high-valent-oxo',
        'invalid',
        'High-valent oxo ion: the colour is charge transfer; 10Dq is a formality.',
      ),
    );
  }
  if (composition.geometry === 'octahedral' && ion.dElectrons > 0 && ion.dElectrons < 10) {
    const strength = jahnTellerExpectation(ion.dElectrons, 'high');
    if (strength === 'strong') {
      flags.push(
        flag(
          'jahn-teller',
          'caution',
          'Strong Jahn-Teller distortion expected: broad or split bands, 10Dq is a band centre.',
        ),
      );
    }
  }
  return flags;
}

/** What the estimate leaves out, one sentence each. */
export function leftOutOf(composition: Composition, ion: IonRecord): string[] {
  const out = ['Solvent and ion-pair shifts are not included.'];
  if (ion.dElectrons === 0 || ion.dElectrons === 10) return out;
  if (ion.zeta0.value !== null) {
    out.push(
      `Spin-orbit coupling (zeta about ${Math.round(ion.zeta0.value)} cm-1) is left out of the levels.`,
    );
  } else {
    out.push('Spin-orbit coupling is left out of the levels; its size is not on file for this ion.');
  }
  if (composition.geometry === 'octahedral' && Object.keys(composition.ligands).length > 1) {
    out.push('The splitting of the bands by unlike ligands is not resolved in the cubic levels.');
  }
  return out;
}
