import type { IonRecord, LigandRecord, ParameterLibrary } from '../library';
import { classMean, softnessMean } from './donorClass';
import { defaultDoubts } from './defaultDoubts';
import type { Factor } from './ligandStrength';

/** Between the nearest neighbours with a published h in a nephelauxetic order. */
function fromOrder(ligand: LigandRecord, library: ParameterLibrary): Factor | null {
  for (const series of library.series.nephelauxetic) {
    const at = series.places.findIndex((place) => place.includes(ligand.id));
    if (at < 0) continue;
    const near = (places: readonly (readonly string[])[]): number | null => {
      for (const place of places) {
        for (const id of place) {
          const h = library.ligands.get(id)?.h.value;
          if (h != null) return h;
        }
      }
      return null;
    };
    const below = near(series.places.slice(0, at).reverse());
    const above = near(series.places.slice(at + 1));
    if (below === null || above === null) continue;
    const value = (below + above) / 2;
    return {
      value,
      sigma: Math.max(defaultDoubts.publishedH, Math.abs(above - below) / 3 / value),
      route: 'series-place',
      reasons: [{ kind: 'source', text: `h between ${below} and ${above} (${series.source})` }],
    };
  }
  return null;
}

/** Nephelauxetic factor h of a ligand; null where nothing like it has one. */
export function ligandCovalency(ligand: LigandRecord, library: ParameterLibrary): Factor | null {
  const { h } = ligand;
  if (h.value !== null) {
    return {
      value: h.value,
      sigma: h.sigma !== null ? h.sigma / h.value : defaultDoubts.publishedH,
      route: 'published-factors',
      reasons: [{ kind: 'source', text: `h(${ligand.abbreviation}) = ${h.value} (${h.source})` }],
    };
  }
  const ordered = fromOrder(ligand, library);
  if (ordered !== null) return ordered;
  const published = (other: LigandRecord): number | null => other.h.value;
  const found = classMean(ligand, library, published, 1) ?? softnessMean(ligand, library, published);
  if (found === null) return null;
  return {
    value: found.mean,
    sigma: Math.max(defaultDoubts.classH, (found.spread ?? 0) / found.mean),
    route: 'donor-class',
    reasons: [
      { kind: 'assumption', text: `h = ${found.mean.toFixed(2)}, mean of ${found.members.join(', ')}` },
    ],
  };
}

interface Neighbour {
  readonly ion: IonRecord;
  readonly weight: number;
}

/**
 * The nearest ions with a k on either side along the row, of the same charge (else of the nearest), weighed by how near
 * they are; of another row where there is none in its own.
 */
function neighbours(ion: IonRecord, library: ParameterLibrary): Neighbour[] {
  const known = [...library.ions.values()].filter((other) => other.k.value !== null);
  const charges = [...new Set(known.map(({ oxidationState }) => oxidationState))];
  const away = (charge: number): number => Math.abs(charge - ion.oxidationState);
  const charge = charges.toSorted((a, b) => away(a) - away(b))[0];
  const alike = known.filter(({ oxidationState }) => oxidationState === charge);
  const row = alike.filter(({ period }) => period === ion.period);
  const used = row.length > 0 ? row : alike;
  const nearest = (side: readonly IonRecord[]): IonRecord | undefined =>
    side.toSorted(
      (a, b) => Math.abs(a.dElectrons - ion.dElectrons) - Math.abs(b.dElectrons - ion.dElectrons),
    )[0];
  const left = nearest(used.filter(({ dElectrons }) => dElectrons <= ion.dElectrons));
  const right = nearest(used.filter(({ dElectrons }) => dElectrons > ion.dElectrons));
  if (left === undefined || right === undefined) {
    const only = left ?? right;
    return only === undefined ? [] : [{ ion: only, weight: 1 }];
  }
  const span = right.dElectrons - left.dElectrons;
  return [
    { ion: left, weight: (right.dElectrons - ion.dElectrons) / span },
    { ion: right, weight: (ion.dElectrons - left.dElectrons) / span },
  ];
}

/** Nephelauxetic factor k of an ion, from the table or from its neighbours along the row. */
export function metalCovalency(ion: IonRecord, library: ParameterLibrary): Factor | null {
  const { k } = ion;
  if (k.value !== null) {
    return {
      value: k.value,
      sigma: k.sigma !== null ? k.sigma / k.value : defaultDoubts.publishedK,
      route: 'published-factors',
      reasons: [{ kind: 'source', text: `k(${ion.ion}) = ${k.value} (${k.source})` }],
    };
  }
  const near = neighbours(ion, library);
  if (near.length === 0) return null;
  const value = near.reduce((sum, { ion: other, weight }) => sum + other.k.value! * weight, 0);
  return {
    value,
    sigma: defaultDoubts.analogyK,
    route: 'donor-class',
    reasons: [
      {
        kind: 'assumption',
        text: `no k is in print for ${ion.ion}; ${value.toFixed(2)} after ${near.map(({ ion: other }) => other.ion).join(' and ')}, its neighbours`,
      },
    ],
  };
}
