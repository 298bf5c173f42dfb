import { randomBytes } from 'node:crypto';
import type { Stats } from 'node:fs';
import { stat } from 'node:fs/promises';
import { done, type Problem, type Result, refused } from '../../core/problem';
import type { FileTicket } from '../bridge/contract';
import { systemCodeOf } from './faultsInWords';
import { readBounded, sha256Of } from './readScenarioFile';

interface Seen {
  readonly sha256: string;
  /** null: not looked at, or gone meanwhile; then only the content tells. */
  readonly stamp: string | null;
}

export interface Tickets {
  /** The same file always gets the same ticket. */
  readonly ticketFor: (path: string) => FileTicket;
  readonly pathOf: (ticket: unknown) => Result<string>;
  /** Notes what the file holds now: as read, or as saved. */
  readonly noteContent: (path: string, sha256: string) => Promise<void>;
  /** Refuses when another program has changed the file since we last read or saved it. */
  readonly checkUnchanged: (path: string) => Promise<Result<'unchanged'>>;
}

const UNKNOWN_FILE: Problem = {
  code: 'unknown-file',
  at: '',
  message: 'This file is not known any more.',
  remedy: 'Save under a name, or open the file again.',
};

const CHANGED: Problem = {
  code: 'changed-on-disk',
  at: '',
  message: 'Another program has changed this file since it was opened here.',
  remedy: 'Save under another name to keep both, or open the file again.',
};

const stampOf = ({ mtimeMs, size, ino }: Stats): string => `${mtimeMs} ${size} ${ino}`;

const statOf = (path: string): Promise<Stats | null> =>
  stat(path).catch((error: unknown) => {
    if (systemCodeOf(error) === 'ENOENT') return null;
    throw error;
  });

/** Stands between the page and the paths: the page holds tickets, only the host knows the files behind them. */
export function createTickets(): Tickets {
  const paths = new Map<string, string>();
  const tickets = new Map<string, FileTicket>();
  const seen = new Map<string, Seen>();
  return {
    ticketFor: (path) => {
      const known = tickets.get(path);
      if (known !== undefined) return known;
      const ticket = randomBytes(16).toString('hex') as FileTicket;
      tickets.set(path, ticket);
      paths.set(ticket, path);
      return ticket;
    },
    pathOf: (ticket) => {
      const path = typeof ticket === 'string' ? paths.get(ticket) : undefined;
      return path === undefined ? refused(UNKNOWN_FILE) : done(path);
    },
    noteContent: async (path, sha256) => {
      const now = await statOf(path);
      seen.set(path, { sha256, stamp: now === null ? null : stampOf(now) });
    },
    checkUnchanged: async (path) => {
      const last = seen.get(path);
      const now = await statOf(path);
      // A file that is gone can be written anew: nobody's work is lost.
      if (last === undefined || now === null || stampOf(now) === last.stamp) return done('unchanged');
      const bytes = await readBounded(path);
      return bytes.ok && sha256Of(bytes.value) === last.sha256 ? done('unchanged') : refused(CHANGED);
    },
  };
}
