import exampleText from '../../assets/demo/white-base.sunder.json?raw';
import { done, type Problem, type Result, refused } from '../../core/problem';
import { checkScenario, parseScenario } from '../../core/scenario/parse';
import type { Places } from '../files/places';
import type { ScenarioFiles } from '../files/scenarioFiles';
import type { Handlers, HostFacts, OpenFile } from './contract';

export interface HostWindow {
  readonly noteUnsaved: (unsaved: boolean, displayName: string) => void;
  readonly close: () => void;
}

export interface HandlerDependencies {
  readonly facts: HostFacts;
  readonly places: Places;
  readonly files: ScenarioFiles;
  readonly window: HostWindow;
}

const EXAMPLE_NAME = 'White base (example)';
const MAX_SHOWN_NAME_LENGTH = 200;

const BAD_REQUEST: Problem = {
  code: 'bad-request',
  at: '',
  message: 'The window asked for something the program does not know.',
  remedy: 'Restart Sunder; your files are untouched.',
};

/** Told to the page when a request failed by our own fault; what it was stands on the terminal. */
export const HOST_FAULT: Problem = {
  code: 'host-fault',
  at: '',
  message: 'Sunder failed here by a fault of its own.',
  remedy: 'Save under another name, then restart Sunder.',
};

function example(): Result<OpenFile> {
  const scenario = parseScenario(exampleText);
  return scenario.ok ? done({ ticket: null, displayName: EXAMPLE_NAME, scenario: scenario.value }) : scenario;
}

/** What both hosts answer. Arguments come from the page and are looked at before use. */
export const createHandlers = ({ facts, places, files, window }: HandlerDependencies): Handlers => ({
  'host:facts': async () => done(facts),
  'scenario:example': async () => example(),
  'scenario:open': async (name) => {
    if (name !== null && typeof name !== 'string') return refused(BAD_REQUEST);
    const place = await places.toOpen(name);
    if (!place.ok) return place;
    return place.value === 'cancelled' ? done('cancelled') : files.openAt(place.value.path);
  },
  'scenario:open-recent': (ticket) => files.openTicket(ticket),
  'scenario:save': async (ticket, untrusted) => {
    const scenario = checkScenario(untrusted);
    return scenario.ok ? files.save(ticket, scenario.value) : scenario;
  },
  'scenario:save-as': async (untrusted, suggestedName, overwrite) => {
    if (typeof suggestedName !== 'string' || typeof overwrite !== 'boolean') return refused(BAD_REQUEST);
    const scenario = checkScenario(untrusted);
    if (!scenario.ok) return scenario;
    const place = await places.toSave(suggestedName, overwrite);
    if (!place.ok) return place;
    if (place.value === 'cancelled' || place.value === 'exists') return done(place.value);
    return files.saveAt(place.value.path, scenario.value);
  },
  'recent:list': async () => done(await files.recent()),
  'documents:list': () => places.names(),
  'window:unsaved': async (unsaved, displayName) => {
    if (typeof unsaved !== 'boolean' || typeof displayName !== 'string') return refused(BAD_REQUEST);
    window.noteUnsaved(unsaved, displayName.slice(0, MAX_SHOWN_NAME_LENGTH));
    return done('noted');
  },
  'window:close': async () => {
    window.close();
    return done('closing');
  },
});
