/** Closed lists that both the tables and the forms use. Free of Drizzle, so that browser code may import them. */

export const ROLES = ["editor", "scientist", "publisher", "admin"] as const;
export type Role = (typeof ROLES)[number];

export const PERSON_STATES = ["invited", "active", "deactivated"] as const;
export type PersonState = (typeof PERSON_STATES)[number];

export const LINK_PURPOSES = ["invitation", "password-reset"] as const;
export type LinkPurpose = (typeof LINK_PURPOSES)[number];

export const RECORD_KINDS = ["star", "star-cluster", "galaxy", "solar-system-body", "other"] as const;
export type RecordKind = (typeof RECORD_KINDS)[number];

export const RECORD_STATES = ["draft", "vetted"] as const;
export type RecordState = (typeof RECORD_STATES)[number];

export const QUANTITIES = [
  "parallax",
  "proper-motion-ra",
  "proper-motion-dec",
  "radial-velocity",
  "magnitude-v",
  "colour-bv",
] as const;
export type Quantity = (typeof QUANTITIES)[number];

export const MEASUREMENT_STATES = ["proposed", "vetted", "rejected", "superseded"] as const;
export type MeasurementState = (typeof MEASUREMENT_STATES)[number];

export const PRIORS = ["edsd", "uniform-density", "uniform-distance"] as const;
export type PriorName = (typeof PRIORS)[number];

export const INTAKE_STATES = ["uploaded", "applied", "abandoned"] as const;
export type IntakeState = (typeof INTAKE_STATES)[number];

export const EXHIBIT_STATES = ["draft", "submitted", "verified", "approved"] as const;
export type ExhibitState = (typeof EXHIBIT_STATES)[number];

/** A seal binds a person's sign-off to the digest of what they saw. */
export const SEAL_KINDS = ["submitted", "verified", "approved"] as const;
export type SealKind = (typeof SEAL_KINDS)[number];

export const LANGUAGES = ["en", "fr"] as const;
export type LanguageCode = (typeof LANGUAGES)[number];

export const FIGURE_QUANTITIES = ["distance", "light-travel"] as const;
export type FigureQuantity = (typeof FIGURE_QUANTITIES)[number];

export const FIGURE_FORMS = ["value", "range", "value-and-range"] as const;
export type FigureForm = (typeof FIGURE_FORMS)[number];

export const FIGURE_UNITS = ["ly", "pc", "au", "km"] as const;
export type FigureUnit = (typeof FIGURE_UNITS)[number];

export const LICENCES = [
  "CC0-1.0",
  "CC-BY-4.0",
  "CC-BY-SA-4.0",
  "public-domain",
  "own-work",
  "by-written-permission",
] as const;
export type Licence = (typeof LICENCES)[number];

export const VARIANT_FORMATS = ["avif", "webp", "jpeg"] as const;
export type VariantFormat = (typeof VARIANT_FORMATS)[number];

export const OUTBOX_KINDS = ["mail"] as const;
export type OutboxKind = (typeof OUTBOX_KINDS)[number];
