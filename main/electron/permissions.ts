import type { Session } from 'electron';

/** Copying a table writes text to the clipboard after a click; it can read nothing. */
const CLIPBOARD_WRITE = 'clipboard-sanitized-write';

/** Electron grants all by default. The page needs no camera, place, notification, device or clipboard reading. */
export function denyPermissions(session: Session): void {
  session.setPermissionRequestHandler((_contents, permission, answer) => answer(permission === CLIPBOARD_WRITE));
  session.setPermissionCheckHandler((_contents, permission) => permission === CLIPBOARD_WRITE);
  session.setDevicePermissionHandler(() => false);
}
