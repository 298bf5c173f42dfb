/**
 * Chromium without Electron knows no `app:` scheme: `app://bundle/x` is shown to it as `https://bundle.app.test/x`, a
 * secure origin of its own in a domain that is reserved for tests (RFC 6761). The app only ever sees the real address.
 */

/** @param {string} url */
export const shownAddress = (url) => url.replace(/^([a-z][a-z0-9+.-]*):\/\/([^/?#]*)/, 'https://$2.$1.test');

const SHOWN = /^https:\/\/([^/?#]+)\.([a-z][a-z0-9+-]*)\.test(?=[/?#]|$)/;

/** The app's own address, or the same text where it is no address of the app. @param {string} url */
export const realAddress = (url) => url.replace(SHOWN, '$2://$1');

/** @param {string} url @returns {string | null} the scheme of the app that answers this, if one does */
export const schemeOf = (url) => SHOWN.exec(url)?.[2] ?? null;

/**
 * A content security policy that names the scheme has to name what Chromium sees instead.
 * @param {string} policy
 * @param {string} scheme
 */
export const shownPolicy = (policy, scheme) =>
  policy
    .replaceAll(new RegExp(`(?<=[\\s;]|^)${scheme}://([^\\s;/]+)`, 'g'), `https://$1.${scheme}.test`)
    .replaceAll(new RegExp(`(?<=[\\s;]|^)${scheme}:(?=[\\s;]|$)`, 'g'), `https://*.${scheme}.test`);
