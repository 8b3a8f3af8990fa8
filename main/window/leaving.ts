import { type BrowserWindow, dialog } from 'electron';
import type { FlushAnswer } from '../../renderer/host/bridge';

/** How long the page may take to save before the user is asked. */
export const patience_ms = 10_000;

/**
 * Closing waits for the page: it is asked to save, and the window goes once it says that everything is stored. If
 * something cannot be saved, or no answer comes, the user decides.
 */
export class Leaving {
  #request = 0;
  #answer: ((answer: FlushAnswer | 'silent') => void) | null = null;
  #asking = false;

  /** The page's answer; one to an earlier question is ignored. */
  answered(request: number, answer: FlushAnswer): void {
    if (request === this.#request) this.#answer?.(answer);
  }

  guard(
    window: BrowserWindow,
    ask: (request: number) => boolean,
    settle: () => Promise<void>,
    wait_ms: number = patience_ms,
  ): void {
    window.on('close', (event) => {
      event.preventDefault();
      if (this.#asking) return;
      this.#asking = true;
      void this.#decide(window, ask, settle, wait_ms).finally(() => {
        this.#asking = false;
      });
    });
  }

  async #decide(
    window: BrowserWindow,
    ask: (request: number) => boolean,
    settle: () => Promise<void>,
    wait_ms: number,
  ): Promise<void> {
    if (window.webContents.isCrashed()) return window.destroy();
    const answer = await this.#question(ask, wait_ms);
    if (answer === 'silent' || answer.state === 'unsaved') {
      const { response } = await dialog.showMessageBox(window, {
        type: 'warning',
        title: 'Spinhue',
        message:
          answer === 'silent'
            ? 'The window does not answer. What was confirmed as saved is safe; a change of the last seconds may not be.'
            : `Close and lose ${answer.what}?`,
        buttons: ['Keep open', 'Close anyway'],
        defaultId: 0,
        cancelId: 0,
        noLink: true,
      });
      if (response !== 1) return;
    }
    await settle();
    if (!window.isDestroyed()) window.destroy();
  }

  #question(ask: (request: number) => boolean, wait_ms: number): Promise<FlushAnswer | 'silent'> {
    const request = ++this.#request;
    return new Promise((resolve) => {
      const timer = setTimeout(() => resolve('silent'), wait_ms);
      this.#answer = (answer) => {
        clearTimeout(timer);
        resolve(answer);
      };
      // A page that is still loading, or never came up, has nothing to save.
      if (!ask(request)) this.#answer({ state: 'saved' });
    });
  }
}
