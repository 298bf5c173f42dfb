import { protocol } from 'electron';
import { pageHeaders } from '../bridge/contentPolicy';
import { isOurPage, PAGE_HOST, PAGE_SCHEME } from '../bridge/listen';
import { readPageFile } from '../bridge/pageFiles';

export const PAGE_ADDRESS = `${PAGE_SCHEME}://${PAGE_HOST}/index.html`;

/** Has to run before the app is ready. */
export function registerPageScheme(): void {
  protocol.registerSchemesAsPrivileged([
    { scheme: PAGE_SCHEME, privileges: { standard: true, secure: true, supportFetchAPI: true, codeCache: true } },
  ]);
}

const refusal = (status: number): Response => new Response(null, { status, headers: pageHeaders });

export async function answerPageRequest(root: string, address: string, method: string): Promise<Response> {
  if (method !== 'GET') return refusal(405);
  if (!isOurPage(address)) return refusal(404);
  const file = await readPageFile(root, new URL(address).pathname);
  if (file === null) return refusal(404);
  return new Response(file.bytes, { headers: { ...pageHeaders, 'Content-Type': file.type } });
}

/** Serves the built page. */
export function servePage(root: string): void {
  protocol.handle(PAGE_SCHEME, ({ url, method }) => answerPageRequest(root, url, method));
}
