import type { FileData, ProjectCopy } from './bridge';
import type { Answer, CallName, Calls } from './contract';
import { HostError } from './hostError';

/**
 * The plain browser reaches the local server it was started by: the calls of the mirror as JSON over loopback, same
 * names and same checks as in the desktop program. The server marks the page when this window may do so.
 */
export const loopbackCalls = [
  'mirrorStatus',
  'mirrorWrite',
  'mirrorProjects',
  'mirrorRead',
  'mirrorSnapshots',
  'mirrorReadSnapshot',
  'mirrorTakeSnapshot',
  'openExternal',
] as const satisfies readonly CallName[];
export type LoopbackCall = (typeof loopbackCalls)[number];

export const loopbackPath = '/host/';
/** A header that no page of another origin can send without being asked first. */
export const loopbackHeader = 'x-spinhue';
/** Name of the mark in the page's head. */
export const loopbackMark = 'spinhue-loopback';

/** Bytes travel as base64 inside the JSON. */
export type WireData = string | { readonly base64: string };

export function toWire(copy: ProjectCopy): unknown {
  const wire = (data: FileData): WireData => {
    if (typeof data === 'string') return data;
    let binary = '';
    for (let i = 0; i < data.length; i += 0x8000) {
      binary += String.fromCharCode(...data.subarray(i, i + 0x8000));
    }
    return { base64: btoa(binary) };
  };
  return { ...copy, extras: (copy.extras ?? []).map(({ name, data }) => ({ name, data: wire(data) })) };
}

/** Whether the page was served by the local server to the window that it opened. */
export const hasLoopback = (): boolean => document.querySelector(`meta[name="${loopbackMark}"]`) !== null;

export async function callLoopback<N extends LoopbackCall>(
  name: N,
  payload: Calls[N]['payload'] | unknown,
): Promise<Calls[N]['answer']> {
  let response: Response;
  try {
    response = await fetch(loopbackPath + name, {
      method: 'POST',
      headers: { 'content-type': 'application/json', [loopbackHeader]: '1' },
      body: JSON.stringify(payload),
    });
  } catch (cause) {
    throw new HostError(
      {
        code: 'unavailable',
        message: 'The local program that writes the copies no longer answers.',
        remedy:
          'Your data are still in this window. Start the program again; copies are then brought up to date.',
      },
      cause,
    );
  }
  const answer = (await response.json()) as Answer<N>;
  if (!answer.ok) throw new HostError(answer.problem);
  return answer.value;
}
