import type { WorkerLike } from './client';

export const startEstimateWorker = (): WorkerLike =>
  new Worker(new URL('./estimate.worker.ts', import.meta.url), { type: 'module' }) as WorkerLike;

/** Leaves one processor to the window. */
export const bulkWorkers = (): number => Math.max(1, Math.min(6, (navigator.hardwareConcurrency || 2) - 1));
