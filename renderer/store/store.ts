import type { DexieOptions } from 'dexie';
import { Bin } from './bin';
import { databaseName, openDatabase, type SpinhueDatabase } from './database';
import { EstimateCache } from './estimateCache';
import { ChangeFeed } from './feed';
import { Journal } from './journal/journal';
import { type Clock, systemClock } from './journal/writer';
import { AnalysisRepository } from './repositories/analyses';
import { CandidateRepository } from './repositories/candidates';
import { FrozenPredictionRepository, ParameterSetRepository } from './repositories/predictions';
import { MeasurementRepository } from './repositories/measurements';
import { ProjectRepository } from './repositories/projects';
import { SampleRepository } from './repositories/samples';
import { SettingsRepository } from './repositories/settings';
import { ShortlistRepository } from './repositories/shortlist';
import { WishRepository } from './repositories/wishes';

/** Everything that views read and write. */
export interface Store {
  readonly db: SpinhueDatabase;
  readonly clock: Clock;
  readonly feed: ChangeFeed;
  readonly journal: Journal;
  readonly projects: ProjectRepository;
  readonly candidates: CandidateRepository;
  readonly frozenPredictions: FrozenPredictionRepository;
  readonly samples: SampleRepository;
  readonly measurements: MeasurementRepository;
  readonly analyses: AnalysisRepository;
  readonly parameterSets: ParameterSetRepository;
  readonly wishes: WishRepository;
  readonly shortlist: ShortlistRepository;
  readonly settings: SettingsRepository;
  readonly bin: Bin;
  readonly estimates: EstimateCache;
  close(): void;
}

export interface StoreOptions {
  readonly name?: string;
  readonly dexie?: DexieOptions;
  readonly clock?: Clock;
  /** Called when another window needs the database in a newer version. */
  readonly onTakenOver?: () => void;
}

/** @throws {StoreError} where the database cannot or must not be opened. */
export async function openStore(options: StoreOptions = {}): Promise<Store> {
  const { name = databaseName, clock = systemClock } = options;
  const db = await openDatabase(name, options.dexie);
  db.on('versionchange', () => {
    db.close();
    options.onTakenOver?.();
  });
  const feed = new ChangeFeed(`${name}-changes`);
  const journal = new Journal(db, feed, clock);
  const samples = new SampleRepository(db);
  return {
    db,
    clock,
    feed,
    journal,
    projects: new ProjectRepository(db, journal, clock),
    candidates: new CandidateRepository(db, journal),
    frozenPredictions: new FrozenPredictionRepository(db, journal),
    samples,
    measurements: new MeasurementRepository(db, journal, samples),
    analyses: new AnalysisRepository(db, journal),
    parameterSets: new ParameterSetRepository(db, journal),
    wishes: new WishRepository(db, journal),
    shortlist: new ShortlistRepository(journal),
    settings: new SettingsRepository(db),
    bin: new Bin(db, journal),
    estimates: new EstimateCache(db),
    close: () => {
      feed.close();
      db.close();
    },
  };
}
