import type { FigureForm } from "#app/database/enums.ts";
import { addScene } from "#app/exhibits/add-scene.server.ts";
import { addToCast } from "#app/exhibits/add-to-cast.server.ts";
import { bindFigure } from "#app/exhibits/bind-figure.server.ts";
import { createExhibit } from "#app/exhibits/create-exhibit.server.ts";
import { saveScene } from "#app/exhibits/save-scene.server.ts";
import { saveWords } from "#app/exhibits/save-words.server.ts";
import { SceneDocument } from "#app/scene/document.ts";
import type { Team } from "./accounts.ts";
import type { Catalogue } from "./catalogue.ts";

interface SeedScene {
  titleEn: string;
  titleFr: string;
  document: Record<string, unknown>;
  cast: string[];
  figures: { key: string; of: string; form: FigureForm; quantity?: "distance" | "light-travel" }[];
  en: string;
  fr: string;
}

interface SeedExhibit {
  slug: string;
  titleEn: string;
  titleFr: string;
  scenes: SeedScene[];
}

export const NEAREST_SUNS: SeedExhibit = {
  slug: "nearest-suns",
  titleEn: "The nearest suns",
  titleFr: "Les soleils les plus proches",
  scenes: [
    {
      titleEn: "Around the corner",
      titleFr: "Au coin de la rue",
      document: { mapping: "linear", camera: { azimuthDeg: -52, elevationDeg: 26, distance: 0.95, fovDeg: 40 } },
      cast: [
        "Barnard's Star",
        "Sirius",
        "Epsilon Eridani",
        "Groombridge 34 A",
        "Procyon",
        "Tau Ceti",
        "van Maanen's Star",
        "40 Eridani A",
        "Altair",
        "70 Ophiuchi",
      ],
      figures: [
        { key: "barnard", of: "Barnard's Star", form: "value" },
        { key: "sirius", of: "Sirius", form: "value" },
        { key: "altair", of: "Altair", form: "value-and-range" },
      ],
      en: "The Sun has quiet neighbours. Barnard’s Star is {barnard} away, and far too faint for the naked eye; Alpha Centauri, nearer still, is not in this picture. Sirius, at {sirius}, is the brightest star of our night.\n\nFarthest out in this little crowd is Altair, {altair}.",
      fr: "Le Soleil a des voisins discrets. L’étoile de Barnard est à {barnard}, et bien trop faible pour l’œil nu ; Alpha du Centaure, plus proche encore, n’est pas dans cette image. Sirius, à {sirius}, est l’étoile la plus brillante de notre nuit.\n\nLa plus lointaine de ce petit groupe est Altaïr : {altair}.",
    },
    {
      titleEn: "How far is that bright star?",
      titleFr: "À quelle distance, cette étoile brillante ?",
      document: { mapping: "log", camera: { azimuthDeg: 38, elevationDeg: 32, distance: 0.9, fovDeg: 40 } },
      cast: [
        "Sirius",
        "Procyon",
        "Vega",
        "Arcturus",
        "Capella",
        "Aldebaran",
        "Regulus",
        "Achernar",
        "Polaris",
        "Rigel",
      ],
      figures: [
        { key: "vega", of: "Vega", form: "value" },
        { key: "capella", of: "Capella", form: "value" },
        { key: "rigel", of: "Rigel", form: "value-and-range" },
        { key: "arcturus-light", of: "Arcturus", form: "value", quantity: "light-travel" },
      ],
      en: "Bright does not mean near. Vega and Capella look almost the same to us, yet Vega is {vega} away and Capella {capella}. Rigel comes close to both, and it is {rigel} away: its light is strong enough to cross all that.\n\nThe light of Arcturus has been on its way for {arcturus-light}.",
      fr: "Brillante ne veut pas dire proche. Véga et Capella nous paraissent presque semblables, et pourtant Véga est à {vega} et Capella à {capella}. Rigel brille presque autant, et elle est à {rigel} : sa lumière est assez forte pour franchir tout cela.\n\nLa lumière d’Arcturus voyage depuis {arcturus-light}.",
    },
    {
      titleEn: "The great lights, far behind",
      titleFr: "Les grandes lumières, loin derrière",
      document: { mapping: "linear", camera: { azimuthDeg: -140, elevationDeg: 22, distance: 0.9, fovDeg: 40 } },
      cast: ["Canopus", "Spica", "Polaris", "Antares", "Betelgeuse", "Rigel", "Deneb"],
      figures: [
        { key: "canopus", of: "Canopus", form: "value" },
        { key: "betelgeuse", of: "Betelgeuse", form: "range" },
        { key: "deneb", of: "Deneb", form: "range" },
      ],
      en: "Some stars are bright because they are giants. Canopus shines second only to Sirius from {canopus} away. For Betelgeuse the measurement leaves room: it is {betelgeuse} away, and Deneb {deneb}.\n\nLook for the red bars along the line of sight. They show how well each distance is known.",
      fr: "Certaines étoiles brillent parce que ce sont des géantes. Canopus, seconde derrière Sirius, est à {canopus}. Pour Bételgeuse, la mesure laisse une marge : sa distance est comprise {betelgeuse}, et celle de Deneb {deneb}.\n\nCherchez les barres rouges le long de la ligne de visée : elles montrent à quel point chaque distance est connue.",
    },
  ],
};

export const FAMILIAR_PATTERN: SeedExhibit = {
  slug: "familiar-pattern",
  titleEn: "A familiar pattern, from the side",
  titleFr: "Une figure familière, vue de côté",
  scenes: [
    {
      titleEn: "Seven stars, one picture",
      titleFr: "Sept étoiles, une image",
      document: { mapping: "linear", camera: { azimuthDeg: -120, elevationDeg: 8, distance: 0.85, fovDeg: 40 } },
      cast: ["Alkaid", "Mizar", "Alioth", "Megrez", "Phecda", "Merak", "Dubhe"],
      figures: [
        { key: "alkaid", of: "Alkaid", form: "value" },
        { key: "dubhe", of: "Dubhe", form: "value" },
        { key: "merak", of: "Merak", form: "value" },
      ],
      en: "From here they make one picture. Turn it and see how deep it is: Merak is {merak} away, while Alkaid, at one end, is {alkaid} away, and Dubhe, at the other, {dubhe}.",
      fr: "D’ici, elles forment une seule image. Tournez-la pour voir sa profondeur : Merak est à {merak}, Alkaid, à un bout, à {alkaid}, et Dubhe, à l’autre, à {dubhe}.",
    },
  ],
};

/** Builds an exhibit as a curator does, verb by verb. */
export async function buildExhibit(team: Team, catalogue: Catalogue, of: SeedExhibit): Promise<string> {
  const { slug, titleEn, titleFr } = of;
  const exhibitId = await createExhibit(team.curator, { slug, titleEn, titleFr });
  for (const scene of of.scenes) await buildScene(team, catalogue, exhibitId, scene);
  return exhibitId;
}

async function buildScene(team: Team, catalogue: Catalogue, exhibitId: string, of: SeedScene): Promise<void> {
  const { curator } = team;
  const idOf = (name: string) => {
    const id = catalogue.get(name);
    if (!id) throw new Error(`the demo has no star called ${name}`);
    return id;
  };
  const { titleEn, titleFr } = of;
  const sceneId = await addScene(curator, { exhibitId, titleEn, titleFr });
  let version = 1;
  const next = () => {
    version += 1;
    return version - 1;
  };
  await saveScene(curator, {
    sceneId,
    version: next(),
    titleEn,
    titleFr,
    document: SceneDocument.parse({ kind: "volume", ...of.document }),
  });
  await addToCast(curator, { sceneId, version: next(), recordId: of.cast.map(idOf) });
  for (const { key, of: name, form, quantity = "distance" } of of.figures) {
    await bindFigure(curator, { sceneId, version: next(), key, recordId: idOf(name), quantity, unit: "ly", form });
  }
  await saveWords(curator, { sceneId, version: next(), en: of.en, fr: of.fr });
}
