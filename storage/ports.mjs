import { createServer } from "node:net";

/**
 * A free port on loopback. The preferred one if it is free.
 * @param {number} [preferred]
 * @returns {Promise<number>}
 */
export async function freePort(preferred = 0) {
  if (preferred && (await isFree(preferred))) return preferred;
  return listenBriefly(0);
}

/** @param {number} port @param {string} [host] */
export async function isFree(port, host = "127.0.0.1") {
  return (await whyNotFree(port, host)) === null;
}

/**
 * @param {number} port @param {string} host
 * @returns {Promise<string | null>} null when one can listen there; otherwise the code of the error, such as "EADDRINUSE"
 */
export async function whyNotFree(port, host) {
  return listenBriefly(port, host).then(
    () => null,
    (error) => String(error.code),
  );
}

/** @param {number} port @param {string} [host] @returns {Promise<number>} */
function listenBriefly(port, host = "127.0.0.1") {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", reject);
    server.listen(port, host, () => {
      const address = server.address();
      const taken = typeof address === "object" && address ? address.port : port;
      server.close(() => resolve(taken));
    });
  });
}
