import type { IncomingMessage, ServerResponse } from 'node:http';
import type { ProjectCopy } from '../../renderer/host/bridge';
import type { Answer, Calls } from '../../renderer/host/contract';
import { HostError, type HostProblem } from '../../renderer/host/hostError';
import { type LoopbackCall, loopbackCalls, type WireData } from '../../renderer/host/loopback';
import { payloadLimits, payloadSchemas } from '../../renderer/host/payloads';

export type LoopbackHandlers = {
  readonly [N in LoopbackCall]: (
    payload: Calls[N]['payload'],
  ) => Promise<Calls[N]['answer']> | Calls[N]['answer'];
};

/** JSON escapes and base64 make a payload longer than its limit. */
const largestBody_bytes = payloadLimits.bytes * 1.4;

class BodyTooLarge extends Error {}

async function bodyOf(request: IncomingMessage): Promise<string> {
  const chunks: Buffer[] = [];
  let length = 0;
  for await (const chunk of request as AsyncIterable<Buffer>) {
    length += chunk.length;
    if (length > largestBody_bytes) throw new BodyTooLarge();
    chunks.push(chunk);
  }
  return Buffer.concat(chunks).toString('utf8');
}

/** Bytes come as base64; everything else is left to the schema. */
function fromWire(payload: unknown): unknown {
  if (typeof payload !== 'object' || payload === null) return payload;
  const record = payload as { copy?: unknown; extras?: unknown };
  if (Object.hasOwn(record, 'copy')) return { ...record, copy: fromWire(record.copy) };
  if (!Array.isArray(record.extras)) return payload;
  const extras = record.extras.map((extra: { name: string; data: WireData } | null) => {
    const data = extra?.data;
    return typeof data === 'object' && data !== null && typeof data.base64 === 'string'
      ? { ...extra, data: new Uint8Array(Buffer.from(data.base64, 'base64')) }
      : extra;
  });
  return { ...(payload as ProjectCopy), extras };
}

const problemAnswer = (problem: HostProblem): { ok: false; problem: HostProblem } => ({ ok: false, problem });
const refused = (message: string): ReturnType<typeof problemAnswer> =>
  problemAnswer({
    code: 'refused',
    message,
    remedy: 'Nothing was changed. Report this as a fault of the program.',
  });

async function answerTo(name: string, body: string, handlers: LoopbackHandlers): Promise<unknown> {
  if (!(loopbackCalls as readonly string[]).includes(name)) return refused('There is no such call.');
  const call = name as LoopbackCall;
  let payload: unknown;
  try {
    payload = fromWire(JSON.parse(body));
  } catch {
    return refused('The request is not JSON.');
  }
  const checked = payloadSchemas[call].safeParse(payload);
  if (!checked.success) {
    const issue = checked.error.issues[0]!;
    return refused(
      `The request ${call} is not acceptable: ${issue.path.join('.')} ${issue.message.slice(0, 200)}.`,
    );
  }
  try {
    const value = await (handlers[call] as (payload: unknown) => unknown)(checked.data);
    return { ok: true, value } satisfies Answer<LoopbackCall> | { ok: true; value: unknown };
  } catch (error) {
    if (error instanceof HostError) {
      return problemAnswer({ code: error.code, message: error.message, remedy: error.remedy });
    }
    throw error;
  }
}

export async function answerLoopback(
  name: string,
  request: IncomingMessage,
  response: ServerResponse,
  handlers: LoopbackHandlers,
): Promise<void> {
  let answer: unknown;
  try {
    answer = await answerTo(name, await bodyOf(request), handlers);
  } catch (error) {
    if (!(error instanceof BodyTooLarge)) throw error;
    answer = problemAnswer({
      code: 'too-large',
      message: 'The project is too large to be copied this way.',
      remedy: 'Export it, or use the desktop program.',
    });
  }
  response.writeHead(200, { 'content-type': 'application/json', 'x-content-type-options': 'nosniff' });
  response.end(JSON.stringify(answer));
}
