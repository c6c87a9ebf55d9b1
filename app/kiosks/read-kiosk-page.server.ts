import { eq } from "drizzle-orm";
import { db } from "#app/database/db.server.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { kiosk } from "#app/database/schema/kiosks.ts";
import { readNewestEdition } from "#app/editions/read-newest.server.ts";
import { NotFound } from "#app/errors.ts";
import { readPictureSources } from "#app/media/read-media.server.ts";

/** What the kiosk page shows; public. `edition` is null while no exhibit is assigned. @throws NotFound */
export async function readKioskPage(slug: string) {
  const [found] = await db()
    .select({ kiosk, exhibitSlug: exhibit.slug })
    .from(kiosk)
    .leftJoin(exhibit, eq(exhibit.id, kiosk.exhibitId))
    .where(eq(kiosk.slug, slug));
  if (!found) throw new NotFound("There is no kiosk at this address.");
  const { name, station, language, idleSeconds } = found.kiosk;
  const place = { slug, name, station, language, idleSeconds };
  if (!found.exhibitSlug) return { kiosk: place, exhibit: null, edition: null };
  const edition = await readNewestEdition(found.exhibitSlug);
  const { number, digest, content, stills } = edition;
  const shown = content.scenes.flatMap((scene) => (scene.picture ? [scene.picture.digest] : []));
  const pictures = await readPictureSources([...new Set(shown)]);
  return { kiosk: place, exhibit: found.exhibitSlug, edition: { number, digest, content, stills, pictures } };
}
