/** Something that a person must put right before the program can start: one clear sentence, exit 1. */
export class Refusal extends Error {}

/**
 * Turns the usual errors of files and sockets into a sentence that says what to do.
 * @param {unknown} error
 * @param {string} doing what was being done, such as "writing to storage/var"
 * @returns {unknown} a Refusal where the error is a known one, otherwise the error itself
 */
export function asRefusal(error, doing) {
  const code = /** @type {NodeJS.ErrnoException} */ (error)?.code;
  if (code === "ENOSPC" || code === "EDQUOT") {
    return new Refusal(`The disk is full (${doing}). Free some space, then start again; nothing is lost.`);
  }
  if (code === "EACCES" || code === "EPERM" || code === "EROFS") {
    return new Refusal(`No permission: ${doing}. Give this user the right to write there, or set ALIDADE_VAR to a folder of its own.`);
  }
  return error;
}
