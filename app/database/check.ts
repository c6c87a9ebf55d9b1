/** One thing that must hold before the application can serve, and whether it does. */
export interface Check {
  name: string;
  ok: boolean;
  detail: string;
}

/** Runs one check; what it throws is its failure, in words. */
export async function checked(name: string, look: () => Promise<{ ok: boolean; detail: string }>): Promise<Check> {
  try {
    return { name, ...(await look()) };
  } catch (error) {
    return { name, ok: false, detail: deepest(error) };
  }
}

function deepest(error: unknown): string {
  if (!(error instanceof Error)) return String(error);
  if (error.cause instanceof Error) return deepest(error.cause);
  return error.message || error.name;
}
