// `dialog` of the stand-in: answered from a queue that the test fills; a question nobody expects is an error.
import { modelled } from './notModelled.mjs';

/** A path, null for "cancelled", or the number of a button. @type {unknown[]} */
export const answers = [];

/** What the app asked, in order: tests look at titles, filters and buttons. */
const asked = /** @type {{ kind: string, options: unknown }[]} */ ([]);

/** The parent window comes first, or is left out. @param {string} kind @param {unknown[]} words */
function nextAnswer(kind, words) {
  const options = words.at(-1);
  asked.push({ kind, options });
  if (answers.length === 0) throw new Error(`${kind} was shown, and the test had put no answer into the queue`);
  return answers.shift();
}

/** @param {string} kind @param {unknown[]} words */
function pathFor(kind, words) {
  const answer = nextAnswer(kind, words);
  if (answer !== null && typeof answer !== 'string') throw new Error(`${kind} needs a path or null, not ${answer}`);
  return answer;
}

/** @param {string} kind @param {unknown[]} words */
function buttonFor(kind, words) {
  const answer = nextAnswer(kind, words);
  if (typeof answer !== 'number') throw new Error(`${kind} needs the number of a button, not ${answer}`);
  return answer;
}

export const dialog = modelled('dialog', {
  asked,
  showOpenDialog: async (/** @type {unknown[]} */ ...words) => {
    const path = pathFor('showOpenDialog', words);
    return { canceled: path === null, filePaths: path === null ? [] : [path] };
  },
  showSaveDialog: async (/** @type {unknown[]} */ ...words) => {
    const path = pathFor('showSaveDialog', words);
    return { canceled: path === null, filePath: path ?? '' };
  },
  showMessageBox: async (/** @type {unknown[]} */ ...words) => ({
    response: buttonFor('showMessageBox', words),
    checkboxChecked: false,
  }),
  showMessageBoxSync: (/** @type {unknown[]} */ ...words) => buttonFor('showMessageBoxSync', words),
  showErrorBox: (/** @type {string} */ title, /** @type {string} */ content) => {
    asked.push({ kind: 'showErrorBox', options: { title, content } });
    process.stderr.write(`${title}: ${content}\n`);
  },
});
