// The programs behind `npm start`, `npm test` and `npm run bench`: they run before anything is installed, so they
// use Node alone.

/** A failure told in plain sentences: what is wrong, and what to do about it. */
export class Failure extends Error {
  /** @param {string} message what is wrong @param {string} remedy what to do @param {number} exitCode */
  constructor(message, remedy = '', exitCode = 1) {
    super(remedy ? `${message}\n${remedy}` : message);
    this.exitCode = exitCode;
  }
}

const FILE_TROUBLE = {
  EACCES: 'Permission is missing there: start Hacklebook as the user who owns the project folder.',
  EPERM: 'Permission is missing there: start Hacklebook as the user who owns the project folder.',
  EROFS: 'The disk is read-only there: move the project to a folder that can be written.',
  ENOSPC: 'The disk is full: make room and start again.',
  EMFILE: 'Too many files are open on this machine: close some programs and start again.',
};

/** One or two sentences for the person at the keyboard, for any error; never a stack trace. */
export function sentencesFor(error) {
  if (error instanceof Failure) return error.message;
  const remedy = FILE_TROUBLE[error?.code];
  if (remedy) return `${error.path ?? 'A file'} could not be used (${error.code}).\n${remedy}`;
  return `Something unforeseen went wrong: ${error?.message ?? error}`;
}
