import type { Problem } from '../../core/problem';

type Doing = 'read' | 'save';

const ELSEWHERE = 'Save under another name or in another folder.';

/** What the system's error codes mean to a person, and the way on. */
const SAVING = new Map<string, readonly [message: string, remedy: string]>([
  ['ENOSPC', ['The disk is full.', 'Free some space and save again, or save on another disk.']],
  ['EDQUOT', ['Your share of the disk is full.', 'Remove files you no longer need, or save on another disk.']],
  ['EACCES', ['You may not write in this folder.', ELSEWHERE]],
  ['EPERM', ['You may not write this file, or another program holds it.', `Close it there, or: ${ELSEWHERE}`]],
  ['EROFS', ['This folder can only be read.', ELSEWHERE]],
  ['ENOENT', ['The folder of this file is no longer there.', `Plug the drive in again, or: ${ELSEWHERE}`]],
  ['ENOTDIR', ['The folder of this file is no longer a folder.', ELSEWHERE]],
  ['EISDIR', ['There is a folder of this name.', 'Choose another name.']],
  ['ENAMETOOLONG', ['The file name is too long.', 'Choose a shorter name.']],
  ['EBUSY', ['Another program holds this file.', `Close it there and save again, or: ${ELSEWHERE}`]],
  ['EIO', ['The drive reports a fault.', 'Save on another drive now.']],
  ['EMFILE', ['Too many files are open.', 'Close some programs and save again.']],
  ['ENFILE', ['Too many files are open.', 'Close some programs and save again.']],
  ['EFBIG', ['The drive takes no file of this size.', 'Save on another drive.']],
]);

const READING = new Map<string, readonly [message: string, remedy: string]>([
  ['ENOENT', ['The file is no longer there.', 'It may have been moved or renamed: look for it and open it there.']],
  ['ENOTDIR', ['The file is no longer there.', 'It may have been moved or renamed: look for it and open it there.']],
  ['EACCES', ['You may not read this file.', 'Ask its owner for the right to read it, or copy it elsewhere.']],
  ['EPERM', ['You may not read this file.', 'Ask its owner for the right to read it, or copy it elsewhere.']],
  ['EISDIR', ['This is a folder, not a file.', 'Choose a file that ends in .sunder.json.']],
  ['EBUSY', ['Another program holds this file.', 'Close it there and open it again.']],
  ['EIO', ['The drive reports a fault.', 'Try again, or take the file from a copy.']],
  ['EMFILE', ['Too many files are open.', 'Close some programs and try again.']],
  ['ENFILE', ['Too many files are open.', 'Close some programs and try again.']],
  ['ELOOP', ['The link to this file leads in a circle.', 'Open the file itself.']],
]);

export const systemCodeOf = (error: unknown): string | undefined => {
  if (!(error instanceof Error) || !('code' in error)) return undefined;
  return typeof error.code === 'string' ? error.code : undefined;
};

/** A fault of the file system as a problem in words. Anything that is not one is our bug and is thrown again. */
export function faultInWords(error: unknown, doing: Doing): Problem {
  const code = systemCodeOf(error);
  if (code === undefined) throw error;
  const [message, remedy] = (doing === 'save' ? SAVING : READING).get(code) ?? [
    `The file cannot be ${doing === 'save' ? 'saved' : 'read'} (${code}).`,
    doing === 'save' ? ELSEWHERE : 'Try again, or open a copy of it.',
  ];
  return { code: `file-${code.toLowerCase()}`, at: '', message, remedy };
}
