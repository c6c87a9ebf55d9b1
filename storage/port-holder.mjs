import { readdirSync, readFileSync, readlinkSync } from "node:fs";

const LISTENING = "0A";

/**
 * Which process listens on a TCP port, in words ("node, process 4711"), where this user may know it.
 * @param {number} port
 * @returns {string | null}
 */
export function portHolder(port) {
  const sockets = ["/proc/net/tcp", "/proc/net/tcp6"].flatMap((table) => listeners(table, port));
  if (sockets.length === 0) return null;
  for (const pid of readdirSync("/proc").filter((entry) => /^\d+$/.test(entry))) {
    if (openFiles(pid).some((target) => sockets.includes(target))) return `${nameOf(pid)}, process ${pid}`;
  }
  return null;
}

/** @param {string} table @param {number} port @returns {string[]} as the links in /proc/PID/fd name them */
function listeners(table, port) {
  const wanted = port.toString(16).toUpperCase().padStart(4, "0");
  try {
    return readFileSync(table, "utf8")
      .trim()
      .split("\n")
      .slice(1)
      .map((line) => line.trim().split(/\s+/))
      .filter(([, local, , state]) => local?.endsWith(`:${wanted}`) && state === LISTENING)
      .map((fields) => `socket:[${fields[9]}]`);
  } catch {
    return [];
  }
}

/** @param {string} pid */
function openFiles(pid) {
  try {
    return readdirSync(`/proc/${pid}/fd`).map((fd) => {
      try {
        return readlinkSync(`/proc/${pid}/fd/${fd}`);
      } catch {
        return "";
      }
    });
  } catch {
    return [];
  }
}

/** @param {string} pid */
function nameOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/comm`, "utf8").trim();
  } catch {
    return "a program";
  }
}
