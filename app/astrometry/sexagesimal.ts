/** How a text wrote an angle: one bare number, or parts led by hours, degrees, or nothing that says which. */
export type Leading = "number" | "hours" | "degrees" | "unmarked";

export interface Sexagesimal {
  /** -1 or 1, also where the leading part is zero ("-00 30 00"). */
  sign: -1 | 1;
  leading: Leading;
  /** In the leading unit, without sign. */
  magnitude: number;
}

/** One spelling for each mark. */
function plainMarks(text: string): string {
  return text
    .trim()
    .replace(/[−–]/g, "-")
    .replace(/ʰ/g, "h")
    .replace(/ᵐ/g, "m")
    .replace(/ˢ/g, "s")
    .replace(/''|[″”“]/g, '"')
    .replace(/[′’‘]/g, "'")
    .replace(/º/g, "°")
    .replace(/deg(rees?)?/gi, "°")
    .replace(/[HDMS]/g, (mark) => mark.toLowerCase())
    .replace(/d/g, "°");
}

const NUMBER = String.raw`(\d+(?:\.\d*)?|\.\d+)`;
const BARE = new RegExp(`^(${NUMBER}(?:[eE][+-]?\\d+)?)$`);
const SPACED = new RegExp(`^(\\d+)\\s+${NUMBER}(?:\\s+${NUMBER})?$`);
const COLONS = new RegExp(`^(\\d+)\\s*:\\s*${NUMBER}(?:\\s*:\\s*${NUMBER})?$`);
/** The mark of the last part may be left away: "17h57m48.5". */
const HOURS = new RegExp(`^${NUMBER}\\s*h(?:\\s*${NUMBER}\\s*(?:m\\s*(?:${NUMBER}\\s*s?)?)?)?$`);
const DEGREES = new RegExp(`^${NUMBER}\\s*°(?:\\s*${NUMBER}\\s*(?:[m']\\s*(?:${NUMBER}\\s*[s"]?)?)?)?$`);

/** Whole seconds are summed first, so that a single division rounds. */
function magnitudeOf(parts: string[], text: string): number {
  if (parts.slice(0, -1).some((part) => part.includes("."))) {
    throw new RangeError(`"${text}": only the last part may have decimals`);
  }
  const [whole = 0, minutes = 0, seconds = 0] = parts.map(Number);
  if (minutes >= 60) throw new RangeError(`"${text}": minutes must be below 60`);
  if (seconds >= 60) throw new RangeError(`"${text}": seconds must be below 60`);
  return parts.length === 1 ? whole : (whole * 3600 + minutes * 60 + seconds) / 3600;
}

/**
 * Reads one angle: "269.452", "17 57 48.5", "17:57:48.5", "17h57m48.5s", "4°41′36.2″", "-00 30 00".
 * @returns sign, leading unit, and magnitude in it; no range is checked beyond minutes and seconds below 60
 * @throws RangeError with the text and what is wrong with it
 */
export function parseSexagesimal(text: string): Sexagesimal {
  const plain = plainMarks(text);
  const [, mark = "", rest = ""] = /^([+-]?)\s*(.*)$/s.exec(plain) ?? [];
  const sign = mark === "-" ? -1 : 1;
  const bare = BARE.exec(rest);
  if (bare) return { sign, leading: "number", magnitude: Number(bare[1]) };
  const spellings: [Leading, RegExp][] = [
    ["unmarked", SPACED],
    ["unmarked", COLONS],
    ["hours", HOURS],
    ["degrees", DEGREES],
  ];
  for (const [leading, spelling] of spellings) {
    const parts = spelling.exec(rest)?.slice(1);
    if (!parts) continue;
    return {
      sign,
      leading,
      magnitude: magnitudeOf(
        parts.filter((part) => part !== undefined),
        text,
      ),
    };
  }
  throw new RangeError(`"${text}" is not an angle: write degrees (269.452) or parts (17 57 48.5)`);
}
