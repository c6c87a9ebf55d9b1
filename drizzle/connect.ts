import mysql from "mysql2/promise";

/** A connection for the commands of this folder; a database that cannot be reached ends them with one sentence. */
export async function connectOrExplain(url: string): Promise<mysql.Connection> {
  try {
    return await mysql.createConnection({ uri: url, timezone: "Z" });
  } catch (error) {
    const { host } = new URL(url);
    const why = error instanceof Error ? error.message || String((error as NodeJS.ErrnoException).code) : String(error);
    console.error(`The database at ${host} cannot be used (${why}); look at DATABASE_URL.`);
    process.exit(1);
  }
}
