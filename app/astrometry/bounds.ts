/**
 * The widest numbers that the room computes with: sixty decades, far beyond anything measurable, and narrow enough
 * that no square or cube of a ratio of two of them overflows a double.
 */
const SMALLEST = 1e-30;
const LARGEST = 1e30;

/** @throws RangeError naming the parameter unless it is a number of at most 1e30 either way */
export function requireBounded(name: string, value: number): void {
  if (typeof value !== "number" || !Number.isFinite(value)) throw new RangeError(`${name} must be a finite number`);
  if (Math.abs(value) > LARGEST) throw new RangeError(`${name} must be between -1e30 and 1e30`);
}

/** @throws RangeError naming the parameter unless it is a number above zero, between 1e-30 and 1e30 */
export function requirePositive(name: string, value: number): void {
  if (typeof value !== "number" || !Number.isFinite(value)) throw new RangeError(`${name} must be a finite number`);
  if (value <= 0) throw new RangeError(`${name} must be above zero`);
  if (value < SMALLEST || value > LARGEST) throw new RangeError(`${name} must be between 1e-30 and 1e30`);
}
