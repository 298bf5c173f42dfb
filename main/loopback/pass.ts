import { createHash, randomBytes, timingSafeEqual } from 'node:crypto';

const secret = (): string => randomBytes(32).toString('base64url');

/** Compares in a time that does not depend on where the texts differ. */
const isSame = (one: string, other: string): boolean =>
  timingSafeEqual(createHash('sha256').update(one).digest(), createHash('sha256').update(other).digest());

/** Who may talk to the host: whoever came with the ticket, once, and has had the cookie since. */
export interface Pass {
  /** Good for one visit. */
  readonly ticket: () => string;
  /** A new ticket in place of the old one; whoever has the cookie keeps it. */
  readonly renew: () => void;
  readonly isUsed: () => boolean;
  /** The cookie in exchange for the ticket; null for a wrong or used one. */
  readonly exchange: (ticket: string) => string | null;
  readonly admits: (cookieHeader: string | undefined) => boolean;
}

export function createPass(port: () => number): Pass {
  let ticket = secret();
  const key = secret();
  let used = false;
  // Cookies do not know ports, so the name has to.
  const name = () => `s_${port()}`;
  return {
    ticket: () => ticket,
    renew: () => {
      ticket = secret();
      used = false;
    },
    isUsed: () => used,
    exchange: (given) => {
      if (used || !isSame(given, ticket)) return null;
      used = true;
      return `${name()}=${key}; HttpOnly; SameSite=Strict; Path=/`;
    },
    admits: (header) => {
      const start = `${name()}=`;
      const ours = (header ?? '').split('; ').find((cookie) => cookie.startsWith(start));
      return ours !== undefined && isSame(ours.slice(start.length), key);
    },
  };
}
