import type { BrowserWindow, IpcMainInvokeEvent } from 'electron';
import { isOurUrl } from '../guard/origin';

/** Whether a message comes from the main frame of our page in our window; the reason where it does not. */
export function distrust(event: IpcMainInvokeEvent, window: BrowserWindow | null): string | null {
  const { senderFrame, sender } = event;
  if (window === null || sender !== window.webContents) return 'it comes from another window';
  if (!senderFrame) return 'its frame is gone';
  if (senderFrame !== sender.mainFrame) return 'it comes from an embedded frame';
  return isOurUrl(senderFrame.url) ? null : 'it comes from another page';
}
