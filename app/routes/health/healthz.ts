/** GET /healthz: the process is alive. Asks nothing of the database, so that its absence restarts nobody. */
export const loader = () => Response.json({ status: "alive" }, { headers: { "Cache-Control": "no-store" } });
