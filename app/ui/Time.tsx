interface TimeProps {
  /** ISO 8601, or a Date; a moment in UTC. */
  at: string | Date;
  form?: "date" | "moment";
  language?: string;
  /** IANA name of the zone whose clock is shown. Given, never guessed, so that server and browser agree. */
  zone?: string;
}

const FORMS: Record<NonNullable<TimeProps["form"]>, Intl.DateTimeFormatOptions> = {
  date: { day: "numeric", month: "long", year: "numeric" },
  moment: {
    day: "numeric",
    month: "long",
    year: "numeric",
    hour: "2-digit",
    minute: "2-digit",
    timeZoneName: "short",
  },
};

export function Time({ at, form = "date", language = "en-GB", zone = "UTC" }: TimeProps) {
  const moment = typeof at === "string" ? new Date(at) : at;
  const iso = moment.toISOString();
  const text = new Intl.DateTimeFormat(language, { ...FORMS[form], timeZone: zone }).format(moment);
  return <time dateTime={form === "date" && zone === "UTC" ? iso.slice(0, 10) : iso}>{text}</time>;
}
