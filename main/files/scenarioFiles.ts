import { basename, dirname } from 'node:path';
import { done, type Result, refused } from '../../core/problem';
import type { Scenario } from '../../core/scenario/scenario';
import { writeScenario } from '../../core/scenario/write';
import type { OpenFile, RecentFile } from '../bridge/contract';
import { durableWrite } from './durableWrite';
import { faultInWords } from './faultsInWords';
import { readScenarioFile, sha256Of } from './readScenarioFile';
import type { RecentFiles } from './recentFiles';
import { displayNameOf } from './scenarioNames';
import type { Tickets } from './tickets';

export interface ScenarioFiles {
  readonly openAt: (path: string) => Promise<Result<OpenFile>>;
  readonly openTicket: (ticket: unknown) => Promise<Result<OpenFile>>;
  readonly save: (ticket: unknown, scenario: Scenario) => Promise<Result<'saved'>>;
  readonly saveAt: (path: string, scenario: Scenario) => Promise<Result<OpenFile>>;
  readonly recent: () => Promise<readonly RecentFile[]>;
}

/** Opens and saves scenarios; the only place where tickets and paths meet. */
export function createScenarioFiles(tickets: Tickets, recentFiles: RecentFiles): ScenarioFiles {
  const openFile = (path: string, scenario: Scenario): OpenFile => ({
    ticket: tickets.ticketFor(path),
    displayName: displayNameOf(path),
    scenario,
  });

  const write = async (path: string, scenario: Scenario): Promise<void> => {
    // Written out first: a fault here must not touch the file.
    const text = writeScenario(scenario);
    await durableWrite(path, text);
    await tickets.noteContent(path, sha256Of(text));
    await recentFiles.note(path);
  };

  const openAt = async (path: string): Promise<Result<OpenFile>> => {
    const file = await readScenarioFile(path);
    if (!file.ok) return file;
    try {
      await tickets.noteContent(path, file.value.sha256);
    } catch (error) {
      return refused(faultInWords(error, 'read'));
    }
    await recentFiles.note(path);
    return done(openFile(path, file.value.scenario));
  };

  return {
    openAt,
    openTicket: async (ticket) => {
      const path = tickets.pathOf(ticket);
      return path.ok ? openAt(path.value) : path;
    },
    save: async (ticket, scenario) => {
      const path = tickets.pathOf(ticket);
      if (!path.ok) return path;
      try {
        const unchanged = await tickets.checkUnchanged(path.value);
        if (!unchanged.ok) return unchanged;
        await write(path.value, scenario);
        return done('saved');
      } catch (error) {
        return refused(faultInWords(error, 'save'));
      }
    },
    saveAt: async (path, scenario) => {
      try {
        await write(path, scenario);
        return done(openFile(path, scenario));
      } catch (error) {
        return refused(faultInWords(error, 'save'));
      }
    },
    recent: async () =>
      (await recentFiles.paths()).map((path) => ({
        ticket: tickets.ticketFor(path),
        displayName: displayNameOf(path),
        folderName: basename(dirname(path)),
      })),
  };
}
