/**
 * Names a state of a record's ledger. Measurements are never deleted and their versions only grow, so that no later state
 * has the same mark.
 */
export function ledgerMark(ledger: readonly { version: number }[]): string {
  return `${ledger.length}.${ledger.reduce((sum, one) => sum + one.version, 0)}`;
}
