import type { Problem } from '../../errors';
import { findGeometry, type IonRecord, type ParameterLibrary } from '../../library';
import { admittedLigands } from '../space/ligandPool';
import type { Wish } from './wish';

const against = (field: string, message: string, remedy: string): Problem => ({
  code: 'contradictory-wish',
  message,
  field,
  remedy,
});

/** Ions that a wish admits, in the order of the library. */
export function admittedIons(wish: Wish, library: ParameterLibrary): IonRecord[] {
  const named = wish.ions === 'all' ? null : new Set(wish.ions);
  const unwanted = new Set(wish.exclude?.elements ?? []);
  return [...library.ions.values()].filter(
    (ion) => (named === null || named.has(ion.ion)) && !unwanted.has(ion.symbol),
  );
}

/** Unpaired electrons that a d^N ion can have at all: the most by Hund's rule, and fewer by two at a time. */
export function possibleUnpaired(dElectrons: number): number[] {
  const most = dElectrons <= 5 ? dElectrons : 10 - dElectrons;
  return Array.from({ length: Math.floor(most / 2) + 1 }, (_, i) => most - 2 * i);
}

function emptyChoices(wish: Wish, ions: readonly IonRecord[], library: ParameterLibrary): Problem[] {
  const problems: Problem[] = [];
  if (ions.length === 0) {
    problems.push(
      against('ions', 'no metal ion is left to search', 'name an ion, or exclude fewer elements'),
    );
  }
  if (wish.geometries !== 'all' && wish.geometries.length === 0) {
    problems.push(against('geometries', 'no geometry is left to search', 'name at least one geometry'));
  }
  const ligands = admittedLigands(wish, library.ligands.values());
  if (ligands.length === 0) {
    problems.push(
      against(
        'ligands',
        'no ligand passes every condition of the wish',
        'allow more ligands or exclude fewer',
      ),
    );
  } else if (wish.geometries !== 'all') {
    const smallest = Math.min(...ligands.map(({ denticity }) => denticity));
    const roomy = wish.geometries.some((id) => (findGeometry(id)?.coordinationNumber ?? 0) >= smallest);
    if (wish.geometries.length > 0 && !roomy) {
      problems.push(
        against(
          'ligands',
          `every admitted ligand needs ${smallest} places or more, and no chosen geometry has them`,
          'allow ligands of smaller denticity or another geometry',
        ),
      );
    }
  }
  return problems;
}

function spectralConflicts(wish: Wish): Problem[] {
  const problems: Problem[] = [];
  wish.bands?.forEach((band, i) => {
    wish.clear?.forEach((clear, j) => {
      const covered = clear.from_nm <= band.from_nm && clear.to_nm >= band.to_nm;
      if (covered && (band.minMolarAbsorptivity ?? 0) > clear.maxMolarAbsorptivity) {
        problems.push(
          against(
            `bands[${i}]`,
            `a band of at least ${band.minMolarAbsorptivity} L/(mol cm) between ${band.from_nm} and ${band.to_nm} nm is wanted where clear[${j}] allows at most ${clear.maxMolarAbsorptivity}`,
            'narrow the transparency window or lower the wanted absorptivity',
          ),
        );
      }
    });
  });
  return problems;
}

function spinConflicts(wish: Wish, ions: readonly IonRecord[]): Problem[] {
  const problems: Problem[] = [];
  const counts = new Set(ions.map(({ dElectrons }) => dElectrons));
  const { unpaired, spin } = wish;
  if (unpaired !== undefined) {
    const reachable = [...counts].some((d) =>
      possibleUnpaired(d).some((n) => n >= unpaired.min && n <= unpaired.max),
    );
    if (ions.length > 0 && !reachable) {
      problems.push(
        against(
          'unpaired',
          `none of the chosen ions can have ${unpaired.min} to ${unpaired.max} unpaired electrons`,
          'widen the range or choose other ions',
        ),
      );
    }
    if (spin === 'high') {
      const hund = [...counts].some((d) => {
        const most = possibleUnpaired(d)[0]!;
        return most >= unpaired.min && most <= unpaired.max;
      });
      if (reachable && !hund) {
        problems.push(
          against(
            'unpaired',
            'high spin gives each chosen ion another number of unpaired electrons than the wanted range',
            'drop one of the two conditions',
          ),
        );
      }
    }
  }
  if (spin === 'low' && ions.length > 0 && ![...counts].some((d) => d >= 2 && d <= 8)) {
    problems.push(
      against(
        'spin',
        'none of the chosen ions can pair electrons: d0, d1, d9 and d10 have one spin only',
        'choose d2 to d8',
      ),
    );
  }
  return problems;
}

/** Why no complex at all can meet a wish; empty where some might. Found before any search starts. */
export function contradictions(wish: Wish, library: ParameterLibrary): Problem[] {
  const ions = admittedIons(wish, library);
  return [...emptyChoices(wish, ions, library), ...spectralConflicts(wish), ...spinConflicts(wish, ions)];
}
