import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { bareIon, ionName, ionRecords, type IonRecord } from './ions';
import { ligandRecords, type LigandRecord } from './ligands';
import { moreLigands } from './moreLigands';
import { geometries, type GeometryRecord } from './geometries';
import { spectrochemicalSeries, nephelauxeticSeries, type Series } from './series';
import { dElectronCount, findMetal } from './elements';
import type { SourcedValue } from './sourced';

/** Measured parameters of one whole complex, which beat every estimate. Keyed by `complexKey`. */
export interface KnownComplex {
  readonly tenDq?: SourcedValue;
  readonly B?: SourcedValue;
  readonly C?: SourcedValue;
}

/** Everything the estimates rest on. */
export interface ParameterLibrary {
  readonly version: string;
  /** SHA-256 of the content. */
  readonly hash: string;
  readonly ions: ReadonlyMap<string, IonRecord>;
  readonly ligands: ReadonlyMap<string, LigandRecord>;
  readonly geometries: readonly GeometryRecord[];
  readonly series: {
    readonly spectrochemical: readonly Series[];
    readonly nephelauxetic: readonly Series[];
  };
  readonly complexes: ReadonlyMap<string, KnownComplex>;
}

/** Grows when a value or its meaning changes; stored with each prediction. */
const libraryVersion = '1';

function uniqueBy<T>(items: readonly T[], key: (item: T) => string): ReadonlyMap<string, T> {
  const map = new Map<string, T>();
  for (const item of items) {
    if (map.has(key(item))) throw new Error(`the library lists ${key(item)} twice`);
    map.set(key(item), item);
  }
  return map;
}

const contentOf = (ions: readonly IonRecord[], ligands: readonly LigandRecord[]): string =>
  bytesToHex(sha256(utf8ToBytes(JSON.stringify({ ions, ligands }))));

function buildLibrary(): ParameterLibrary {
  const ligands = [...ligandRecords, ...moreLigands];
  const hash = contentOf(ionRecords, ligands);
  return {
    version: `${libraryVersion}-${hash.slice(0, 12)}`,
    hash,
    ions: uniqueBy(ionRecords, (ion) => ion.ion),
    ligands: uniqueBy(ligands, (ligand) => ligand.id),
    geometries,
    series: { spectrochemical: spectrochemicalSeries, nephelauxetic: nephelauxeticSeries },
    complexes: new Map(),
  };
}

export const defaultLibrary: ParameterLibrary = buildLibrary();

/**
 * The record of an ion; for one that the tables do not list but that can exist, a record with the d count and nothing
 * else. `undefined` for a metal or oxidation state that cannot exist.
 */
export function findIon(
  library: ParameterLibrary,
  symbol: string,
  oxidationState: number,
): IonRecord | undefined {
  const listed = library.ions.get(ionName(symbol, oxidationState));
  if (listed !== undefined) return listed;
  const metal = findMetal(symbol);
  if (metal === undefined) return undefined;
  const d = dElectronCount(metal, oxidationState);
  const [low, high] = metal.oxidationStates;
  if (d < 0 || d > 10 || oxidationState < low || oxidationState > high) return undefined;
  return bareIon(symbol, oxidationState, d, metal.period);
}

/** The library with further ligands; an id that is already there keeps its values. */
export function withLigands(library: ParameterLibrary, more: readonly LigandRecord[]): ParameterLibrary {
  const added = more.filter(({ id }) => !library.ligands.has(id));
  if (added.length === 0) return library;
  const ligands = new Map(library.ligands);
  for (const ligand of added) ligands.set(ligand.id, ligand);
  const hash = contentOf([...library.ions.values()], [...ligands.values()]);
  return { ...library, ligands, hash, version: `${libraryVersion}-${hash.slice(0, 12)}` };
}

/** `Cr3+;octahedral;nh3*5,cl*1;` : one spelling per complex, whatever the order of its ligands. */
export function complexKey(composition: {
  readonly metal: string;
  readonly oxidationState: number;
  readonly geometry: string;
  readonly ligands: Readonly<Record<string, number>>;
  readonly isomer?: string | null | undefined;
}): string {
  const set = Object.entries(composition.ligands)
    .sort(([one], [other]) => (one < other ? -1 : 1))
    .map(([id, count]) => `${id}*${count}`)
    .join(',');
  const ion = ionName(composition.metal, composition.oxidationState);
  return `${ion};${composition.geometry};${set};${composition.isomer ?? ''}`;
}
