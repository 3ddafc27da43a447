/** Something a person can put right: what is wrong, and the way out. Anything else that is thrown is a bug of ours. */
export class Problem extends Error {
  /**
   * @param {string} what one sentence
   * @param {string} wayOut one sentence
   */
  constructor(what, wayOut) {
    super(`${what} ${wayOut}`);
    this.name = 'Problem';
    this.what = what;
    this.wayOut = wayOut;
  }
}

/** @param {string} folder */
export const diskFull = (folder) =>
  new Problem(`The disk that holds ${folder} is full.`, 'Free some space and run the command again; it carries on where it stopped.');

/** @param {string} path */
const notOurs = (path) => new Problem(`This user may not write ${path}.`, 'Run the command as the user who owns the folder, or clone the project into a folder of your own.');

/**
 * @param {unknown} error
 * @returns {string} the error's own text and that of whatever caused it
 */
const textOf = (error) => (error instanceof Error ? `${error.message} ${error.cause ? textOf(error.cause) : ''}` : String(error));

/**
 * Turns whatever was thrown into the lines to show. A full disk can surface anywhere, so it is recognised here.
 * @param {unknown} error
 * @param {string} folder where the project is
 * @returns {string}
 */
export function explain(error, folder) {
  if (error instanceof Problem) return `${error.what}\n${error.wayOut}`;
  if (/ENOSPC|No space left on device/i.test(textOf(error))) return explain(diskFull(folder), folder);
  if (error instanceof Error && 'code' in error && (error.code === 'EACCES' || error.code === 'EROFS') && 'path' in error) return explain(notOurs(String(error.path)), folder);
  if (error instanceof Error) return error.name === 'CommandFailed' ? error.message : (error.stack ?? error.message);
  return String(error);
}
