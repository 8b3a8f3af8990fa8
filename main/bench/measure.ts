import { type Timing } from './report';

interface Contestant {
  readonly what: string;
  readonly run: () => void;
  /** Calls per sample: a sample should last some milliseconds for the clock. */
  readonly batch?: number;
}

/** Processor time of this process so far, milliseconds: waiting for a core that others hold does not count. */
export function processorTime(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}

/**
 * Times several ways to do the same in turn, round by round, so that a busy moment of the machine hits all of them, in
 * processor time. The best sample counts: disturbances only ever add. `rounds` samples each after one of warm-up.
 */
export function measure(contestants: readonly Contestant[], rounds: number): Timing[] {
  const best = contestants.map(() => Infinity);
  for (let round = rounds === 1 ? 1 : 0; round <= rounds; round++) {
    contestants.forEach(({ run, batch = 1 }, i) => {
      const start = processorTime();
      for (let call = 0; call < batch; call++) run();
      const each = (processorTime() - start) / batch;
      if (round > 0) best[i] = Math.min(best[i]!, each);
    });
  }
  return contestants.map(({ what, batch = 1 }, i) => ({
    what,
    milliseconds: best[i]!,
    repeats: rounds * batch,
  }));
}
