/** What a person chose; "system" follows the machine's own setting. */
export const THEME_CHOICES = ["system", "light", "dark"] as const;
export type ThemeChoice = (typeof THEME_CHOICES)[number];

export const THEME_COOKIE = "theme";
const YEAR_S = 365 * 24 * 3600;

export function isThemeChoice(text: unknown): text is ThemeChoice {
  return THEME_CHOICES.some((choice) => choice === text);
}

/** Reads the choice from a Cookie header; anything unknown is "system". */
export function themeFromCookie(header: string | null): ThemeChoice {
  for (const pair of (header ?? "").split(";")) {
    const [name, value] = pair.trim().split("=");
    if (name === THEME_COOKIE && isThemeChoice(value)) return value;
  }
  return "system";
}

/** The Set-Cookie header that keeps a choice for a year. No secret: it says light or dark and nothing else. */
export function themeCookie(choice: ThemeChoice, secure: boolean): string {
  return `${THEME_COOKIE}=${choice}; Path=/; Max-Age=${YEAR_S}; SameSite=Lax; HttpOnly${secure ? "; Secure" : ""}`;
}

/** A path of this site to go back to, or the front page: never an address elsewhere. */
export function pathHere(text: unknown): string {
  if (typeof text !== "string" || !text.startsWith("/")) return "/";
  const base = "http://here.invalid";
  const url = URL.canParse(text, base) ? new URL(text, base) : null;
  // "/.//elsewhere" is here while it is read, and "//elsewhere", which is not, once it is written down.
  const isHere = url?.origin === base && !url.pathname.startsWith("//");
  return isHere ? `${url.pathname}${url.search}` : "/";
}
