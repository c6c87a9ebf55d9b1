import type { Regime } from "#app/astrometry/parallax.ts";
import type { FigureForm, FigureQuantity, FigureUnit, Licence } from "#app/database/enums.ts";
import type { SceneDocument } from "#app/scene/document.ts";
import type { Paragraph } from "./words.ts";

/**
 * The resolved content of an exhibit: everything a visitor can see of it, with every figure worked out. This is what is
 * canonicalised, digested, sealed, published and shown. Plain JSON; no ids that change without the content changing.
 */
export interface ExhibitContent {
  format: "alidade-exhibit/1";
  slug: string;
  title: Bilingual;
  languages: ("en" | "fr")[];
  scenes: SceneContent[];
}

/** `fr` is null where the exhibit is not shown in French. */
export interface Bilingual {
  en: string;
  fr: string | null;
}

export interface SceneContent {
  id: string;
  title: Bilingual;
  document: SceneDocument;
  claims: { positions: "to-scale" | "not-to-scale"; sizes: "to-scale" | "not-to-scale" };
  cast: CastContent[];
  /** By key, as the words name them. */
  figures: Record<string, FigureContent>;
  words: { en: Paragraph[]; fr: Paragraph[] | null };
  picture: PictureContent | null;
}

export interface SourceContent {
  citation: string;
  bibcode: string | null;
  doi: string | null;
  locator: string | null;
}

export interface CastContent {
  recordId: string;
  name: Bilingual;
  labelled: boolean;
  raDeg: number | null;
  decDeg: number | null;
  epoch: string | null;
  bv: number | null;
  vMag: number | null;
  parallax: { raw: string; value: string; error: string | null; unit: string } | null;
  distancePc: { value: number; low: number; high: number } | null;
  regime: Regime | null;
  method: string | null;
  /** What a visitor reads when they touch it, in light-years. */
  distance: { en: FigureWords; fr: FigureWords } | null;
  source: SourceContent | null;
  /** false: the record was not vetted when this was resolved. */
  vetted: boolean;
}

export interface FigureWords {
  text: string;
  value: string | null;
  low: string;
  high: string;
  unit: string;
  note: string | null;
}

export interface FigureContent {
  recordId: string;
  quantity: FigureQuantity;
  unit: FigureUnit;
  form: FigureForm;
  en: FigureWords | null;
  fr: FigureWords | null;
  source: SourceContent | null;
  /** Why it cannot be said, where `en` is null. */
  reason: string | null;
}

export interface PictureContent {
  digest: string;
  width: number;
  height: number;
  creator: string;
  creditLine: string;
  licence: Licence;
  alt: Bilingual;
}
