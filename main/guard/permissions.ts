import type { Session } from 'electron';

/** Copying to the clipboard is a feature; nothing else that a page can ask for is. */
export const isPermitted = (permission: string): boolean => permission === 'clipboard-sanitized-write';

/** Electron grants everything unless told otherwise: every way to ask is answered here. */
export function denyPermissions(session: Session): void {
  session.setPermissionRequestHandler((_contents, permission, answer) => answer(isPermitted(permission)));
  session.setPermissionCheckHandler((_contents, permission) => isPermitted(permission));
  session.setDevicePermissionHandler(() => false);
  session.setDisplayMediaRequestHandler((_request, answer) => answer({}));
}
