// Each names itself after the ones whose pages it wants to be given, so the order matters (from memory).
const BROWSERS: [RegExp, string][] = [
  [/Edg\w*\//, "Edge"],
  [/OPR\//, "Opera"],
  [/Firefox\/|FxiOS\//, "Firefox"],
  [/Chrom(?:e|ium)\/|CriOS\/|HeadlessChrome\//, "Chrome or Chromium"],
  [/Safari\//, "Safari"],
];
const SYSTEMS: [RegExp, string][] = [
  [/iPhone|iPad/, "iOS"],
  [/Android/, "Android"],
  [/CrOS/, "ChromeOS"],
  [/Windows/, "Windows"],
  [/Mac OS X/, "macOS"],
  [/Linux/, "Linux"],
];

const nameIn = (list: [RegExp, string][], text: string) => list.find(([pattern]) => pattern.test(text))?.[1];

/** A User-Agent header in the words by which a person knows their own machine: "Firefox on Linux". */
export function browserWords(userAgent: string): string {
  const browser = nameIn(BROWSERS, userAgent);
  const system = nameIn(SYSTEMS, userAgent);
  if (browser && system) return `${browser} on ${system}`;
  return browser ?? (userAgent ? userAgent.slice(0, 60) : "a program that does not say its name");
}
