import { describe, expect, it, vi } from 'vitest';
import type { CandidateInput } from '../../core/record/composition';
import { EstimateClient, type WorkerLike } from './client';
import { EstimatePool } from './pool';
import type { FromWorker, ToWorker } from './protocol';
import { serve, type Predictor } from './serve';
import type { Band } from '../../core/transitions/types';
import { transmittanceOf } from './transmittance';

const input = (id: string): CandidateInput => ({
  id,
  metal: 'Cr',
  oxidationState: 3,
  geometry: 'octahedral',
  ligands: { nh3: 6 },
});
const refusing: Predictor = (inputs) => inputs.map(({ id }) => ({ ok: false, id, problems: [] }));

/** The two halves joined without a thread between them. */
function fakeWorker(predict: Predictor = refusing): WorkerLike & { sent: ToWorker[] } {
  const sent: ToWorker[] = [];
  const worker: WorkerLike & { sent: ToWorker[] } = {
    sent,
    postMessage: (message) => {
      sent.push(message);
      setTimeout(() => handle(message), 0);
    },
    terminate: () => undefined,
    onmessage: null,
    onerror: null,
  };
  const handle = serve(
    { postMessage: (data: FromWorker) => worker.onmessage?.({ data } as MessageEvent<FromWorker>) },
    () => predict,
  );
  return worker;
}

describe('estimating in the background', () => {
  it('answers a single question with the whole prediction or its problems', async () => {
    const client = new EstimateClient(fakeWorker());
    expect(await client.one(input('a'), null)).toEqual({ ok: false, id: 'a', problems: [] });
    expect(client.busy).toBe(0);
  });

  it('hands over every summary of a list exactly once', async () => {
    const pool = new EstimatePool(() => fakeWorker(), 3);
    const seen: string[] = [];
    const inputs = Array.from({ length: 1234 }, (_, index) => input(`c${index}`));
    await pool.many(inputs, null, (summaries) => seen.push(...summaries.map(([id]) => id)));
    expect(seen.sort()).toEqual(inputs.map(({ id }) => id).sort());
  });

  it('turns a candidate that breaks the engine into a refusal and goes on with the others', async () => {
    const predict: Predictor = (given) => {
      if (given.some(({ id }) => id === 'bad')) throw new Error('no such thing');
      return refusing(given);
    };
    const seen = new Map<string, unknown>();
    const client = new EstimateClient(fakeWorker(predict));
    await client.many([input('good'), input('bad'), input('last')], null, (all) => {
      for (const [id, summary] of all) seen.set(id, summary);
    });
    expect([...seen.keys()]).toEqual(['good', 'bad', 'last']);
    expect(seen.get('bad')).toMatchObject({ ok: false, problems: [{ message: 'no such thing' }] });
  });

  it('stops soon after it is cancelled', async () => {
    const slow: Predictor = (given) => {
      const until = performance.now() + 15;
      while (performance.now() < until);
      return refusing(given);
    };
    const predict = vi.fn(slow);
    const client = new EstimateClient(fakeWorker(predict));
    const stop = new AbortController();
    const inputs = Array.from({ length: 1000 }, (_, index) => input(`c${index}`));
    const running = client.many(inputs, null, () => stop.abort(), stop.signal);
    await expect(running).rejects.toMatchObject({ name: 'AbortError' });
    await new Promise((resolve) => setTimeout(resolve, 120));
    expect(predict.mock.calls.length).toBeLessThan(20);
  });

  it('fails all that wait when the worker dies', async () => {
    const worker = fakeWorker();
    worker.postMessage = () => undefined;
    const client = new EstimateClient(worker);
    const waiting = client.one(input('a'), null);
    worker.onerror?.({ message: 'out of memory' } as ErrorEvent);
    await expect(waiting).rejects.toThrow('out of memory');
  });
});

describe('the transmission strip', () => {
  it('lets pass 10 % at the centre of a band of absorbance 1, and half of that absorbance at half height', () => {
    // Beer-Lambert: A = 50 L mol-1 cm-1 x 20 mM x 1 cm = 1.
    const at = (energy_cm1: number) =>
      transmittanceOf({
        bands: [{ energy_cm1, width_cm1: 2000, molarAbsorptivity: 50 } as Band],
        conditions: { concentration_mM: 20, path_cm: 1, temperature_K: 298.15 },
      })![(500 - 380) / 5];
    expect(at(20_000)).toBeCloseTo(0.1, 3);
    expect(at(21_000)).toBeCloseTo(10 ** -0.5, 3);
  });
});
