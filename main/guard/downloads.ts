import type { Session } from 'electron';

/** Files leave the program through its own save dialog only. */
export function refuseDownloads(session: Session): void {
  session.on('will-download', (event, item) => {
    event.preventDefault();
    item.cancel();
  });
}
