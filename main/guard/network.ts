import type { App, Session } from 'electron';
import { isOurUrl } from './origin';

/** Requests of the page's own making: its files, pictures that it drew, and the developer tools of an unpackaged build. */
export function mayLoad(address: string, packaged: boolean): boolean {
  if (isOurUrl(address) || address.startsWith('data:')) return true;
  if (address.startsWith('blob:')) return isOurUrl(address.slice('blob:'.length));
  return !packaged && address.startsWith('devtools:');
}

/** Nothing leaves the machine: no name is resolved, no proxy asked, no request outside the program's own scheme sent. */
export function silenceNetwork(app: App): void {
  app.commandLine.appendSwitch('host-resolver-rules', 'MAP * ~NOTFOUND');
  for (const name of ['disable-background-networking', 'disable-component-update', 'no-pings']) {
    app.commandLine.appendSwitch(name);
  }
}

export function blockRequests(
  session: Session,
  packaged: boolean,
  log: (line: string) => void = () => undefined,
): void {
  session.webRequest.onBeforeRequest((details, answer) => {
    const allowed = mayLoad(details.url, packaged);
    if (!allowed) log(`refused a request to ${details.url.slice(0, 200)}`);
    answer({ cancel: !allowed });
  });
  void session.setProxy({ mode: 'direct' });
}
