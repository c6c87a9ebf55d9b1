import { mkdtempSync, writeFileSync } from "node:fs";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, test } from "vitest";
import { readAddress } from "./address.mjs";
import { requireMariadb, requireNode } from "./bootstrap.mjs";
import { portHolder } from "./port-holder.mjs";
import { asRefusal, Refusal } from "./refusal.mjs";
import { prepareVarFolder } from "./var-folder.mjs";

const folder = () => mkdtempSync(join(tmpdir(), "alidade-refusal-"));
const run = { owner: "nobody", step: async () => 0 };

test("a Node.js that is too old or too new is refused with its version", () => {
  for (const version of ["18.20.0", "20.18.3", "23.1.0"]) expect(() => requireNode(version)).toThrow(version);
  for (const version of ["20.19.0", "20.20.2", "22.3.0"]) expect(() => requireNode(version)).not.toThrow();
});

test("without MariaDB an ordinary user is told the exact command, and nothing is installed", async () => {
  const install = async () => {
    throw new Error("must not install");
  };
  await expect(requireMariadb(run, { find: () => null, root: false, install })).rejects.toThrow(
    "MariaDB is not installed; ask somebody with root rights to run: apt-get update && apt-get install -y --no-install-recommends mariadb-server",
  );
});

test("without MariaDB root installs it", async () => {
  const installed: string[] = [];
  const install = async (packages: string[]) => void installed.push(...packages);
  await requireMariadb(run, { find: () => installed.length > 0, root: true, install });
  expect(installed).toEqual(["mariadb-server"]);
});

test("a disk with too little room is refused before anything is written", () => {
  const at = join(folder(), "var");
  const statfs = () => ({ bavail: 1024, bsize: 4096 });
  expect(() => prepareVarFolder(at, { statfs })).toThrow(`The disk that holds ${at} is full: 4 MB are free`);
  expect(() => prepareVarFolder(at, { statfs })).toThrow(Refusal);
});

test("a disk that fills while writing becomes a sentence", () => {
  const error = Object.assign(new Error("write"), { code: "ENOSPC" });
  expect(asRefusal(error, "/data")).toEqual(
    new Refusal("The disk is full (while writing to /data). Free some space, then start again; nothing is lost."),
  );
});

test("an error that is none of the usual ones is passed on as it is", () => {
  const error = new Error("something else");
  expect(asRefusal(error, "/data")).toBe(error);
});

test("a folder that cannot be made is refused with its path", () => {
  const file = join(folder(), "file");
  writeFileSync(file, "");
  expect(() => prepareVarFolder(join(file, "var"))).toThrow(`This user cannot write to ${join(file, "var")}`);
});

test("PORT that is no port is refused by name", () => {
  for (const PORT of ["0", "65536", "abc", "80.5", "-1"]) expect(() => readAddress({ PORT })).toThrow("PORT is");
});

test("the address listens on loopback unless told otherwise, and PUBLIC_URL wins", () => {
  expect(readAddress({})).toEqual({ host: "127.0.0.1", port: 4310, url: "http://127.0.0.1:4310" });
  expect(readAddress({ HOST: "0.0.0.0", PORT: "80" }).url).toBe("http://127.0.0.1:80");
  expect(readAddress({ HOST: "::1", PORT: "80" }).url).toBe("http://[::1]:80");
  expect(readAddress({ PUBLIC_URL: "https://alidade.example" }).url).toBe("https://alidade.example");
});

test("who holds a port is named", async () => {
  const server = createServer();
  await new Promise<void>((listening) => server.listen(0, "127.0.0.1", listening));
  const address = server.address();
  const port = typeof address === "object" && address ? address.port : 0;
  expect(portHolder(port)).toContain(`process ${process.pid}`);
  await new Promise((closed) => server.close(closed));
  expect(portHolder(port)).toBeNull();
});
