import { cannotWrite, diskFull } from "./messages.mjs";

/** Something that a person must put right before the program can start: one clear sentence, exit 1. */
export class Refusal extends Error {
  /** @param {string} sentence @param {number} [exitCode] */
  constructor(sentence, exitCode = 1) {
    super(sentence);
    this.exitCode = exitCode;
  }
}

/**
 * Turns the usual errors of files into a sentence that says what to do.
 * @param {unknown} error
 * @param {string} folder what was being written to
 * @returns {unknown} a Refusal where the error is a known one, otherwise the error itself
 */
export function asRefusal(error, folder) {
  const code = /** @type {NodeJS.ErrnoException} */ (error)?.code;
  if (code === "ENOSPC" || code === "EDQUOT") return new Refusal(diskFull(`writing to ${folder}`));
  if (code === "EACCES" || code === "EPERM" || code === "EROFS" || code === "ENOTDIR") {
    return new Refusal(cannotWrite(folder, code));
  }
  return error;
}
