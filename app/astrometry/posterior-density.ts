/**
 * The posterior of a distance in the form it is computed in. With the distance x counted in 1/error (x = r s), the
 * density of ln x is, up to a constant,
 *     G = (power + 1) ln x - x/scale - (snr - 1/x)^2 / 2,     x <= limit.
 * power 2 with a scale: exponentially decreasing space density; 2 with a limit: uniform space density; 0 with a limit:
 * uniform distance. Sources: Bailer-Jones 2015 (PASP 127, 994); Astraatmadja & Bailer-Jones 2016 (ApJ 832, 137).
 */
export interface Shape {
  power: 0 | 2;
  /** Parallax over error, any sign. */
  snr: number;
  /** Prior's length times error; Infinity for none. */
  scale: number;
  /** Prior's limit times error; Infinity for none. */
  limit: number;
}

/** G along v = ln(x / anchor), less its value at the anchor. */
export interface AnchoredDensity {
  at(v: number): number;
  /** A step in v over which G changes by about one, from the slope and curvature there. */
  stepAt(v: number): number;
}

/** exp(v) - 1 - v to full relative precision where |v| < 0.02. */
const secondOrder = (v: number) => ((v * v) / 2) * (1 + (v / 3) * (1 + (v / 4) * (1 + (v / 5) * (1 + v / 6))));

/**
 * G relative to an anchor, expanded so that nothing large cancels however narrow the peak: the linear terms, which
 * vanish at a peak, are gathered into one coefficient.
 * @param anchor x of the point where the result is zero
 * @param isPeak the anchor is a stationary point of G, so the linear coefficient is zero
 */
export function anchoredDensity(shape: Shape, anchor: number, isPeak: boolean): AnchoredDensity {
  const { power, snr, scale } = shape;
  const inverse = 1 / anchor;
  const decay = anchor / scale;
  const pull = (snr - inverse) * inverse;
  const slope = isPeak ? 0 : power + 1 - decay - pull;
  return {
    at(v) {
      let rise: number;
      let fall: number;
      if (Math.abs(v) < 0.02) {
        rise = secondOrder(v);
        fall = secondOrder(-v);
      } else {
        const ratio = Math.exp(v);
        rise = ratio - 1 - v;
        fall = 1 / ratio - 1 + v;
      }
      const shift = inverse * (fall - v);
      return slope * v - decay * rise + pull * fall - (shift * shift) / 2;
    },
    stepAt(v) {
      const ratio = Math.exp(v);
      const nearness = inverse / ratio;
      const gradient = power + 1 - decay * ratio - (snr - nearness) * nearness;
      const curvature = -decay * ratio + (snr - 2 * nearness) * nearness;
      // At a peak the gradient is rounding noise, never above what the curvature gives back.
      const bySlope = v === 0 && isPeak ? 0 : Math.abs(gradient);
      return 1 / Math.max(1, bySlope, Math.sqrt(Math.abs(curvature)));
    },
  };
}
