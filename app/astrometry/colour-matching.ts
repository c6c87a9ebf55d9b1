/** A lobe: height, wavelength of its top, spread to the blue and to the red, nm. */
type Lobe = readonly [height: number, centreNm: number, blueNm: number, redNm: number];

/**
 * The multi-lobe fit of the CIE 1931 2-degree observer: Wyman, Sloan & Shirley 2013, "Simple analytic approximations
 * to the CIE XYZ color matching functions", Journal of Computer Graphics Techniques 2(2), 1-11.
 */
const LOBES: readonly [readonly Lobe[], readonly Lobe[], readonly Lobe[]] = [
  [
    [1.056, 599.8, 37.9, 31.0],
    [0.362, 442.0, 16.0, 26.7],
    [-0.065, 501.1, 20.4, 26.2],
  ],
  [
    [0.821, 568.8, 46.9, 40.5],
    [0.286, 530.9, 16.3, 31.1],
  ],
  [
    [1.217, 437.0, 11.8, 36.0],
    [0.681, 459.0, 26.0, 13.8],
  ],
];

function lobeAt([height, centreNm, blueNm, redNm]: Lobe, nm: number): number {
  const t = (nm - centreNm) / (nm < centreNm ? blueNm : redNm);
  return height * Math.exp((-t * t) / 2);
}

/**
 * The colour matching functions of the CIE 1931 2-degree observer, fitted.
 * @param nm wavelength, nanometres; next to nothing outside 360 to 830
 * @returns x-bar, y-bar, z-bar
 */
export function colourMatching(nm: number): [x: number, y: number, z: number] {
  const sum = (lobes: readonly Lobe[]) => lobes.reduce((total, lobe) => total + lobeAt(lobe, nm), 0);
  return [sum(LOBES[0]), sum(LOBES[1]), sum(LOBES[2])];
}
