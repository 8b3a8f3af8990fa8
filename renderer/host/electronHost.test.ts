import { afterEach, describe, expect, it, vi } from 'vitest';
import { callNames, type DesktopApi, eventFunctions } from './contract';
import { electronHost } from './electronHost';

afterEach(() => document.body.replaceChildren());

/** The preload script's object with every call answered, and a way to play the main process. */
function standIn(answers: Partial<Record<string, unknown>> = {}) {
  const calls: { name: string; payload: unknown }[] = [];
  const listeners: Record<string, (value: unknown) => void> = {};
  const api = Object.fromEntries([
    ...callNames.map((name) => [
      name,
      async (payload: unknown) => {
        calls.push({ name, payload });
        return answers[name] ?? { ok: true, value: null };
      },
    ]),
    ...Object.entries(eventFunctions).map(([event, name]) => [
      name,
      (listener: (value: unknown) => void) => {
        listeners[event] = listener;
        return () => delete listeners[event];
      },
    ]),
  ]) as unknown as DesktopApi;
  return { api, calls, send: (event: string, value: unknown) => listeners[event]!(value) };
}
const answersOf = (calls: { name: string; payload: unknown }[]) =>
  calls.filter(({ name }) => name === 'flushed').map(({ payload }) => payload);

describe('desktop host', () => {
  it('turns a failure that came back as data into an error with code and remedy', async () => {
    const problem = {
      code: 'disk-full',
      message: 'Cannot write x: the disk is full.',
      remedy: 'Free some space.',
    };
    const { api } = standIn({ saveFile: { ok: false, problem } });
    const host = await electronHost(api);
    await expect(host.saveFile({ kind: 'csv', suggestedName: 'a.csv', data: '' })).rejects.toMatchObject({
      name: 'HostError',
      ...problem,
    });
  });

  it('keeps a file that came before anybody listened, and hands it over once', async () => {
    const { api, send } = standIn();
    const host = await electronHost(api);
    send('fileOpened', { name: 'early.spinhue' });
    const seen: string[] = [];
    host.onFileOpened(({ name }) => seen.push(name));
    send('fileOpened', { name: 'late.spinhue' });
    expect(seen).toEqual(['early.spinhue', 'late.spinhue']);
  });

  it('says that the page listens only after it does', async () => {
    const { api, calls } = standIn();
    await electronHost(api);
    expect(calls.map(({ name }) => name)).toEqual(['hostInfo', 'pageReady']);
  });

  it('answers "saved" on closing when nothing is pending', async () => {
    const { api, calls, send } = standIn();
    await electronHost(api);
    send('flush', { request: 7 });
    await vi.waitFor(() => expect(answersOf(calls)).toEqual([{ request: 7, answer: { state: 'saved' } }]));
  });

  it('leaves the field being edited before it answers, so that it is saved', async () => {
    const { api, calls, send } = standIn();
    const host = await electronHost(api);
    const field = document.createElement('textarea');
    document.body.append(field);
    field.focus();
    host.setUnsaved('the notes');
    field.addEventListener('blur', () => setTimeout(() => host.setUnsaved(null), 100));
    const order: string[] = [];
    host.onFlush(async () => {
      order.push('flush');
      return { state: 'saved' };
    });
    send('flush', { request: 1 });
    await vi.waitFor(() => expect(answersOf(calls)).toEqual([{ request: 1, answer: { state: 'saved' } }]));
    expect(order).toEqual(['flush']);
  });

  it('says what is lost when something cannot be saved, or saving throws', async () => {
    const { api, calls, send } = standIn();
    const host = await electronHost(api);
    const stop = host.onFlush(async () => {
      throw new Error('the disk is full');
    });
    send('flush', { request: 1 });
    await vi.waitFor(() => expect(answersOf(calls)).toHaveLength(1));
    stop();
    host.setUnsaved('the new candidate');
    send('flush', { request: 2 });
    await vi.waitFor(() => expect(answersOf(calls)).toHaveLength(2), { timeout: 5000 });
    expect(answersOf(calls)).toEqual([
      { request: 1, answer: { state: 'unsaved', what: 'the disk is full' } },
      { request: 2, answer: { state: 'unsaved', what: 'the new candidate' } },
    ]);
  });
});
