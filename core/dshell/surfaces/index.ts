export { type LevelCurve } from './curves';
export { buildLevelSurface, levelSurface, type LevelSurface, type SurfaceOptions } from './levelSurface';
export { readCurve, type SurfaceReading } from './evaluate';
export { bulkBands, bulkRoom, type BulkBands } from './bulkBands';
