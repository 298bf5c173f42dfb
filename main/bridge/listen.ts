import { type IpcMainInvokeEvent, ipcMain, type WebContents } from 'electron';
import { answer } from './answer';
import type { ElectronHandlers } from './contract';

export const PAGE_SCHEME = 'app';
export const PAGE_HOST = 'bundle';

export function isOurPage(address: string): boolean {
  if (!URL.canParse(address)) return false;
  // Not `origin`: Node gives "null" for a scheme of our own.
  const { protocol, host } = new URL(address);
  return protocol === `${PAGE_SCHEME}:` && host === PAGE_HOST;
}

/** Throws unless the request comes from the top of our own window, showing our own page. */
function vet({ sender, senderFrame }: IpcMainInvokeEvent, ours: WebContents | null): void {
  const trusted =
    senderFrame !== null &&
    ours !== null &&
    sender === ours &&
    senderFrame.parent === null &&
    isOurPage(senderFrame.url);
  if (!trusted) throw new Error('Refused: not the window of Sunder.');
}

/** Registers every handler; the only place that hears from the page. */
export function listen(handlers: ElectronHandlers, contents: () => WebContents | null): void {
  for (const [channel, handler] of Object.entries(handlers)) {
    ipcMain.handle(channel, (event, ...untrusted: unknown[]) => {
      vet(event, contents());
      return answer(channel, handler, untrusted);
    });
  }
}
