/** The star after (1) or before (-1) the chosen one, around the end; the first or the last when none is chosen. */
export function stepStar(recordIds: readonly string[], selectedId: string | null, step: 1 | -1): string | null {
  const at = selectedId === null ? -1 : recordIds.indexOf(selectedId);
  const next = at < 0 ? (step === 1 ? 0 : recordIds.length - 1) : (at + step + recordIds.length) % recordIds.length;
  return recordIds[next] ?? null;
}
