// Every sentence in which the start refuses, in one place, so that each can be read and tested.

/** @param {string} found */
export const wrongNode = (found) =>
  `Alidade needs Node.js 20.19 or newer (below 23); this is ${found}. Install Node.js 20 or 22, then start again.`;

/** @param {string[]} packages */
export const aptCommand = (packages) =>
  `apt-get update && apt-get install -y --no-install-recommends ${packages.join(" ")}`;

export const mariadbMissing = () =>
  `MariaDB is not installed; ask somebody with root rights to run: ${aptCommand(["mariadb-server"])}`;

/** @param {string[]} packages @param {string} said */
export const aptFailed = (packages, said) =>
  `Installing ${packages.join(", ")} failed (${said}). Run it by hand to see why: ${aptCommand(packages)}`;

/** @param {number} port @param {string} host @param {string | null} holder */
export const portInUse = (port, host, holder) =>
  `Port ${port} on ${host} is in use${holder ? ` by ${holder}` : ""}; stop that, or choose another port: PORT=${port + 1} npm start`;

/** @param {number} port @param {string} host @param {string} code */
export const cannotListen = (port, host, code) =>
  code === "EACCES"
    ? `This user may not listen on port ${port}; choose one from 1024 up: PORT=4310 npm start`
    : `Nothing can listen on ${host} here (${code}); set HOST to an address of this machine, or leave it unset.`;

/** @param {string} url @param {string} log */
export const doesNotAnswer = (url, log) => `The web server does not answer at ${url}. Its log says why: ${log}`;

/** @param {string} folder @param {string} why */
export const cannotWrite = (folder, why) =>
  `This user cannot write to ${folder} (${why}); give it the right to, or set ALIDADE_VAR to a folder of its own.`;

/** @param {string} folder @param {number} freeMb @param {number} neededMb */
export const diskAlmostFull = (folder, freeMb, neededMb) =>
  `The disk that holds ${folder} is full: ${freeMb} MB are free and ${neededMb} MB are needed. Free some space, then start again; nothing is lost.`;

/** @param {string} doing */
export const diskFull = (doing) =>
  `The disk is full (while ${doing}). Free some space, then start again; nothing is lost.`;

/** @param {{ url: string, pid: number, startedAt: string }} holder */
export const alreadyRuns = ({ url, pid, startedAt }) =>
  `Alidade already runs at ${url} (process ${pid}, since ${startedAt}). Stop that one first, or start another with its own ALIDADE_VAR and PORT.`;

/** @param {string} value */
export const badPort = (value) => `PORT is ${JSON.stringify(value)}; it must be a whole number from 1 to 65535.`;

/** @param {string} name @param {string} log */
export const keepsStopping = (name, log) =>
  `The ${name} keeps stopping; everything was ended. Its log says why: ${log}`;

/** @param {string} step @param {number | null} code */
export const stepFailed = (step, code) => `${step} failed (exit ${code ?? "by signal"}); what it said stands above.`;

/** @param {string} program */
export const programMissing = (program) => `The program ${program} was not found; install it, then start again.`;
