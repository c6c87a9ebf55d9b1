import { type ChildProcess, spawn, spawnSync } from "node:child_process";
import { once } from "node:events";
import { chmodSync, chownSync, existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, statSync } from "node:fs";
import { createServer } from "node:net";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import mysql from "mysql2/promise";
import { afterEach, expect, test } from "vitest";
import { startMariadb } from "./mariadb.mjs";
import { isRoot, ROOT, VAR } from "./paths.mjs";
import { freePort } from "./ports.mjs";
import { endMarked, findMarked } from "./processes.mjs";

// The start command itself, with the services alone: what it says, what it leaves, how it ends.

const NOBODY = 65_534;
const folders: string[] = [];

function ownFolder() {
  mkdirSync(VAR, { recursive: true });
  const folder = mkdtempSync(join(VAR, `test-start-${process.pid}-`));
  folders.push(folder);
  return folder;
}

afterEach(async () => {
  for (const folder of folders.splice(0)) {
    await endMarked(folder, 3000);
    rmSync(folder, { recursive: true, force: true });
  }
});

interface Started {
  child: ChildProcess;
  said: () => string;
}

function start(folder: string, env: Record<string, string> = {}, more: object = {}): Started {
  const inherited = Object.fromEntries(
    Object.entries(process.env).filter(
      ([name]) => !/^(DATABASE_URL|S3_|SMTP_URL|PUBLIC_URL|MAIL_|SESSION_)/.test(name),
    ),
  );
  const child = spawn(process.execPath, [join(ROOT, "storage", "start.mjs"), "--services-only"], {
    cwd: ROOT,
    env: { ...inherited, ALIDADE_VAR: folder, ...env },
    stdio: ["ignore", "pipe", "pipe"],
    ...more,
  });
  let text = "";
  child.stdout?.on("data", (piece) => (text += piece));
  child.stderr?.on("data", (piece) => (text += piece));
  return { child, said: () => text };
}

async function untilRunning({ child, said }: Started) {
  while (!said().includes("The services run.")) {
    if (child.exitCode !== null) throw new Error(`ended with ${child.exitCode}: ${said()}`);
    await pause(20);
  }
}

async function running(folder: string, env: Record<string, string> = {}) {
  const started = start(folder, { PORT: String(await freePort()), ...env });
  await untilRunning(started);
  return started;
}

async function endOf({ child, said }: Started) {
  if (child.exitCode === null && child.signalCode === null) await once(child, "close");
  return { code: child.exitCode, said: said().trim() };
}

const environmentOf = (folder: string): Record<string, string> =>
  JSON.parse(readFileSync(join(folder, "environment.json"), "utf8"));

for (const signal of ["SIGTERM", "SIGINT", "SIGHUP"] as const) {
  test(`${signal} ends everything within five seconds and leaves no process`, async () => {
    const folder = ownFolder();
    const started = await running(folder);
    expect(findMarked(folder).length).toBeGreaterThanOrEqual(3);
    const began = Date.now();
    started.child.kill(signal);
    expect((await endOf(started)).code).toBe(0);
    expect(Date.now() - began).toBeLessThan(5000);
    expect(findMarked(folder)).toEqual([]);
    expect(existsSync(join(folder, "running.json"))).toBe(false);
  });
}

for (const afterMs of [150, 400, 800]) {
  test(`SIGTERM ${afterMs} ms into the start ends it, and the next start is none the worse`, async () => {
    const folder = ownFolder();
    const interrupted = start(folder, { PORT: String(await freePort()) });
    await pause(afterMs);
    interrupted.child.kill("SIGTERM");
    await endOf(interrupted);
    expect(findMarked(folder)).toEqual([]);
    const again = await running(folder);
    again.child.kill();
    expect((await endOf(again)).code).toBe(0);
  });
}

test("a folder with spaces and a path too long for a socket serve as well as any", async () => {
  const folder = join(ownFolder(), `a folder with spaces ${"x".repeat(90)}`);
  const started = await running(folder);
  const connection = await mysql.createConnection(environmentOf(folder).DATABASE_URL ?? "");
  await connection.end();
  started.child.kill();
  expect((await endOf(started)).code).toBe(0);
  expect(findMarked(folder)).toEqual([]);
});

test("a second start says where the first one runs and does it no harm", async () => {
  const folder = ownFolder();
  const port = String(await freePort());
  const first = await running(folder, { PORT: port });
  const before = findMarked(folder);
  const second = await endOf(start(folder, { PORT: port }));
  expect(second.code).toBe(3);
  expect(second.said).toContain(`Alidade already runs at http://127.0.0.1:${port} (process ${first.child.pid}, since `);
  expect(findMarked(folder)).toEqual(before);
  first.child.kill();
  await endOf(first);
});

test("after kill -9 of the supervisor the next start ends what was left and keeps what was written", async () => {
  const folder = ownFolder();
  const first = await running(folder);
  const connection = await mysql.createConnection(environmentOf(folder).DATABASE_URL ?? "");
  await connection.query("CREATE TABLE kept (n INT)");
  await connection.query("INSERT INTO kept VALUES (42)");
  await connection.end();
  const left = findMarked(folder);
  first.child.kill("SIGKILL");
  await endOf(first);
  const second = await running(folder);
  expect(second.said()).toContain(`Ended ${left.length} processes that an earlier start left behind.`);
  expect(findMarked(folder).filter((pid) => left.includes(pid))).toEqual([]);
  const again = await mysql.createConnection(environmentOf(folder).DATABASE_URL ?? "");
  expect((await again.query("SELECT n FROM kept"))[0]).toEqual([{ n: 42 }]);
  await again.end();
  second.child.kill();
  await endOf(second);
});

test("after kill -9 of all of it the next start recovers by itself", async () => {
  const folder = ownFolder();
  const first = await running(folder);
  first.child.kill("SIGKILL");
  await endMarked(folder, 0);
  await endOf(first);
  const second = await running(folder);
  second.child.kill();
  expect((await endOf(second)).code).toBe(0);
});

test("a service that is killed comes back at the same address", async () => {
  const folder = ownFolder();
  const started = await running(folder);
  const { DATABASE_URL = "", S3_ENDPOINT = "" } = environmentOf(folder);
  for (const pid of findMarked(folder)) process.kill(pid, "SIGKILL");
  const answers = async () => {
    const connection = await mysql.createConnection(DATABASE_URL);
    await connection.end();
    await fetch(S3_ENDPOINT);
  };
  const deadline = Date.now() + 15_000;
  let back = false;
  while (!back && Date.now() < deadline) {
    await pause(100);
    back = await answers().then(
      () => true,
      () => false,
    );
  }
  expect(back).toBe(true);
  expect(started.said()).toContain("The database stopped; starting it again.");
  started.child.kill();
  expect((await endOf(started)).code).toBe(0);
  expect(findMarked(folder)).toEqual([]);
});

test("the database is set as promised, on loopback, with a password of its own in a file that only its owner reads", async () => {
  const folder = ownFolder();
  const started = await running(folder);
  const { DATABASE_URL = "", SESSION_SECRET = "" } = environmentOf(folder);
  expect(SESSION_SECRET).toHaveLength(43);
  for (const file of ["mariadb/password", "session-secret", "environment.json"]) {
    expect(statSync(join(folder, file)).mode & 0o777).toBe(0o600);
  }
  const connection = await mysql.createConnection(DATABASE_URL);
  const [rows] = await connection.query<mysql.RowDataPacket[]>(
    `SELECT @@innodb_flush_log_at_trx_commit AS flush, @@innodb_snapshot_isolation AS isolation, @@sync_binlog AS binlog,
            @@log_bin AS logBin, @@character_set_server AS characters, @@collation_server AS collation,
            @@time_zone AS zone, @@bind_address AS address, @@sql_mode LIKE '%STRICT_TRANS_TABLES%' AS strict`,
  );
  expect(rows).toEqual([
    {
      flush: 1,
      isolation: 1,
      binlog: 1,
      logBin: 1,
      characters: "utf8mb4",
      collation: "utf8mb4_unicode_520_ci",
      zone: "+00:00",
      address: "127.0.0.1",
      strict: 1,
    },
  ]);
  // The tests make databases of their own, and nobody else's can be reached.
  await connection.query("CREATE DATABASE app_test_x");
  await connection.query("DROP DATABASE app_test_x");
  await expect(connection.query("CREATE DATABASE other")).rejects.toThrow("Access denied");
  await connection.end();
  started.child.kill();
  await endOf(started);
});

test("a service that the environment names is not started here", async () => {
  const folder = ownFolder();
  const started = await running(folder, {
    DATABASE_URL: "mysql://u:p@db.example/app",
    SMTP_URL: "smtp://mail.example",
  });
  expect(existsSync(join(folder, "mariadb"))).toBe(false);
  expect(existsSync(join(folder, "mail"))).toBe(false);
  expect(environmentOf(folder)).toMatchObject({
    S3_BUCKET: "alidade-media",
    DATABASE_URL: "mysql://u:p@db.example/app",
  });
  expect(environmentOf(folder)).not.toHaveProperty("MAIL_CATCHER_DIR");
  started.child.kill();
  await endOf(started);
});

test("a port in use is refused: by whom, and how to choose another", async () => {
  const server = createServer();
  await new Promise<void>((listening) => server.listen(0, "127.0.0.1", listening));
  const address = server.address();
  const port = typeof address === "object" && address ? address.port : 0;
  const folder = ownFolder();
  const { code, said } = await endOf(start(folder, { PORT: String(port) }));
  expect(code).toBe(1);
  expect(said).toMatch(
    new RegExp(`^Port ${port} on 127\\.0\\.0\\.1 is in use by .+, process ${process.pid}; stop that`),
  );
  expect(said).toContain(`PORT=${port + 1} npm start`);
  expect(said.split("\n")).toHaveLength(1);
  expect(existsSync(join(folder, "running.json"))).toBe(false);
  await new Promise((closed) => server.close(closed));
});

test("an address that is not of this machine is refused by name", async () => {
  const { code, said } = await endOf(start(ownFolder(), { HOST: "192.0.2.1", PORT: String(await freePort()) }));
  expect(code).toBe(1);
  expect(said).toBe(
    "Nothing can listen on 192.0.2.1 here (EADDRNOTAVAIL); set HOST to an address of this machine, or leave it unset.",
  );
});

test("a PATH without /usr/sbin finds MariaDB all the same", async () => {
  const started = await running(ownFolder(), { PATH: "/usr/bin:/bin" });
  started.child.kill();
  expect((await endOf(started)).code).toBe(0);
});

test("a folder that cannot be written to is refused in one sentence", async () => {
  const folder = ownFolder();
  chmodSync(folder, 0o555);
  // Root may write anywhere: the start is tried as an ordinary user.
  const as = isRoot ? { uid: NOBODY, gid: NOBODY } : {};
  if (isRoot) chownSync(folder, NOBODY, NOBODY);
  const { code, said } = await endOf(start(folder, { PORT: String(await freePort()) }, as));
  chmodSync(folder, 0o755);
  expect(code).toBe(1);
  expect(said).toBe(
    `This user cannot write to ${folder} (EACCES); give it the right to, or set ALIDADE_VAR to a folder of its own.`,
  );
});

/** A small disk of its own, where this machine lets us mount one. */
function smallDisk(folder: string, megabytes: number) {
  if (!isRoot) return false;
  return spawnSync("mount", ["-t", "tmpfs", "-o", `size=${megabytes}m`, "tmpfs", folder]).status === 0;
}

test("a disk with too little room is refused in one sentence", async ({ skip }) => {
  const folder = ownFolder();
  if (!smallDisk(folder, 20)) skip("only root can mount a small disk, and only where that is allowed");
  try {
    const { code, said } = await endOf(start(folder, { PORT: String(await freePort()) }));
    expect(code).toBe(1);
    expect(said).toMatch(/^The disk that holds .+ is full: \d+ MB are free and 300 MB are needed\. Free some space/);
    expect(said.split("\n")).toHaveLength(1);
  } finally {
    spawnSync("umount", [folder]);
  }
});

test("a disk that fills while the database is made is refused in one sentence, and a later start begins anew", async ({
  skip,
}) => {
  const folder = ownFolder();
  if (!smallDisk(folder, 20)) skip("only root can mount a small disk, and only where that is allowed");
  try {
    await expect(startMariadb(join(folder, "mariadb"), { owner: folder })).rejects.toThrow(
      "The disk is full (while creating the database)",
    );
    expect(existsSync(join(folder, "mariadb", "data"))).toBe(false);
  } finally {
    spawnSync("umount", [folder]);
  }
  const mariadb = await startMariadb(join(folder, "mariadb"), { owner: folder });
  await mariadb.stop();
  expect(findMarked(folder)).toEqual([]);
});
