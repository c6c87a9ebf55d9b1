export interface Rule {
  /** On (-1, 1), ascending. */
  nodes: Float64Array;
  weights: Float64Array;
}

/**
 * Nodes and weights of Gauss-Legendre quadrature on (-1, 1): Newton's method on the Legendre polynomial from
 * Tricomi's first guess (Davis & Rabinowitz, Methods of Numerical Integration, 2nd ed. 1984, section 2.7; from memory).
 * @param count how many nodes, 2 to 64; exact for polynomials up to degree 2 count - 1
 * @throws RangeError when the count is not a whole number in that range
 */
export function gaussLegendre(count: number): Rule {
  if (!Number.isInteger(count) || count < 2 || count > 64)
    throw new RangeError("count must be a whole number, 2 to 64");
  const nodes = new Float64Array(count);
  const weights = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    let x = -Math.cos((Math.PI * (i + 0.75)) / (count + 0.5));
    let slope = 1;
    for (let turn = 0; turn < 12; turn++) {
      let [before, polynomial] = [1, x];
      for (let n = 2; n <= count; n++) {
        [before, polynomial] = [polynomial, ((2 * n - 1) * x * polynomial - (n - 1) * before) / n];
      }
      slope = (count * (x * polynomial - before)) / (x * x - 1);
      const step = polynomial / slope;
      x -= step;
      if (Math.abs(step) < 1e-16) break;
    }
    nodes[i] = x;
    weights[i] = 2 / ((1 - x * x) * slope * slope);
  }
  return { nodes, weights };
}
