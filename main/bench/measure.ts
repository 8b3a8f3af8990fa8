import { type Timing } from './report';

interface Contestant {
  readonly what: string;
  readonly run: () => void;
  /** For short ones, calls per sample: a sample should last some milliseconds for the clock. */
  readonly batch?: number;
}

/** Processor time of this process so far, milliseconds: waiting for a core that others hold does not count. */
export function processorTime(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}

/** Short contestants are run this long before the clock counts, so that the compiler has seen them; milliseconds. */
const warmUp = 150;
/** Samples of a short contestant in each round. */
const shortSamples = 5;

/**
 * Times several ways to do the same in turn, round by round, so that a busy moment of the machine hits all of them, in
 * processor time. The best sample counts: disturbances only ever add. A contestant with a `batch` is a short one: it is warmed
 * up and sampled several times a round; a long one runs once a round, and once before where there is more than one round.
 */
export function measure(contestants: readonly Contestant[], rounds: number): Timing[] {
  const best = contestants.map(() => Infinity);
  contestants.forEach(({ run, batch }) => {
    if (batch === undefined) {
      if (rounds > 1) run();
      return;
    }
    const start = processorTime();
    do for (let call = 0; call < batch; call++) run();
    while (processorTime() - start < warmUp);
  });
  for (let round = 0; round < rounds; round++) {
    contestants.forEach(({ run, batch = 1 }, i) => {
      for (let sample = 0; sample < samplesOf(contestants[i]!); sample++) {
        const start = processorTime();
        for (let call = 0; call < batch; call++) run();
        best[i] = Math.min(best[i]!, (processorTime() - start) / batch);
      }
    });
  }
  return contestants.map((contestant, i) => ({
    what: contestant.what,
    milliseconds: best[i]!,
    repeats: rounds * samplesOf(contestant) * (contestant.batch ?? 1),
  }));
}

const samplesOf = ({ batch }: Contestant): number => (batch === undefined ? 1 : shortSamples);
