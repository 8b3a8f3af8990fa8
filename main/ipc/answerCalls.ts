import { type BrowserWindow, ipcMain } from 'electron';
import { type Answer, callChannel, type CallName, callNames, type Calls } from '../../renderer/host/contract';
import { HostError, type HostProblem } from '../../renderer/host/hostError';
import { payloadSchemas } from '../../renderer/host/payloads';
import { distrust } from './trustedSender';

export type Handlers = {
  readonly [N in CallName]: (
    payload: Calls[N]['payload'],
    window: BrowserWindow,
  ) => Promise<Calls[N]['answer']> | Calls[N]['answer'];
};

const refused = (message: string): HostProblem => ({
  code: 'refused',
  message,
  remedy: 'Nothing was changed. Report this as a fault of the program.',
});

/**
 * Registers one handler per call of the contract. A sender that is not our page is rejected; a payload that does not fit
 * its schema is refused before any handler sees it; a handler's failure goes back as data.
 */
export function answerCalls(
  handlers: Handlers,
  ourWindow: () => BrowserWindow | null,
  log: (line: string) => void,
): void {
  const register = <N extends CallName>(name: N): void => {
    ipcMain.handle(callChannel(name), async (event, ...words: unknown[]): Promise<Answer<N>> => {
      const window = ourWindow();
      const reason = distrust(event, window);
      if (reason !== null) {
        log(`rejected the call ${name}: ${reason}`);
        throw new Error(`The call ${name} was rejected: ${reason}.`);
      }
      const checked = payloadSchemas[name].safeParse(words[0]);
      if (words.length !== 1 || !checked.success) {
        const issue = checked.error?.issues[0];
        const place = issue?.path.join('.') ?? '';
        const what = issue?.message.slice(0, 200) ?? 'one value is expected';
        log(`refused a payload of ${name}: ${place} ${what}`);
        return { ok: false, problem: refused(`The request ${name} is not acceptable: ${place} ${what}.`) };
      }
      try {
        return { ok: true, value: await handlers[name](checked.data, window!) };
      } catch (error) {
        if (error instanceof HostError) {
          const { code, message, remedy } = error;
          return { ok: false, problem: { code, message, remedy } };
        }
        log(`${name} failed: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}`);
        return {
          ok: false,
          problem: {
            code: 'failed',
            message: `${name} failed: ${error instanceof Error ? error.message.slice(0, 200) : 'unknown reason'}`,
            remedy: 'Try again; if it happens once more, export the project and restart the program.',
          },
        };
      }
    });
  };
  callNames.forEach(register);
}
