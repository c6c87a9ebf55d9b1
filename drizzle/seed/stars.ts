/**
 * Real stars with published values, typed from memory. `checked` says that the parallax of I/311, its error, V and B-V
 * were afterwards compared, number by number, with public copies of the Hipparcos tables and agree with them; what was
 * not compared says "from memory" in the catalogue until somebody has. No value of Gaia DR3 was compared. Positions are
 * ICRS at J2000.0, from memory and rounded to what memory holds; their notes say so.
 */
export interface SeedStar {
  name: string;
  /** Bayer or other names; "fr:" before a French one. */
  also: string;
  ids: string;
  ra: string;
  dec: string;
  /** The parallax in mas, as the new Hipparcos reduction (I/311) prints it. */
  hipparcos: string | null;
  /** The parallax in mas, as Gaia DR3 prints it. */
  gaia: string | null;
  v: string;
  bv: string | null;
  checked: boolean;
}

type Row = [
  name: string,
  also: string,
  ids: string,
  ra: string,
  dec: string,
  hipparcos: string | null,
  gaia: string | null,
  v: string,
  bv: string | null,
];

// biome-ignore format: one star a line
const CHECKED: Row[] = [
  ["Sirius", "α Canis Majoris", "HIP 32349; HD 48915; HR 2491; GJ 244 A", "06 45 08.9", "-16 42 58", "379.21 ± 1.58", null, "-1.44", "0.009"],
  ["Procyon", "α Canis Minoris", "HIP 37279; HD 61421; HR 2943; GJ 280 A", "07 39 18.1", "+05 13 30", "284.56 ± 1.26", null, "0.40", "0.432"],
  ["Altair", "α Aquilae; fr: Altaïr", "HIP 97649; HD 187642; HR 7557; GJ 768", "19 50 47.0", "+08 52 06", "194.95 ± 0.57", null, "0.76", "0.221"],
  ["Vega", "α Lyrae; fr: Véga", "HIP 91262; HD 172167; HR 7001", "18 36 56.3", "+38 47 01", "130.23 ± 0.36", null, "0.03", "-0.001"],
  ["Fomalhaut", "α Piscis Austrini", "HIP 113368; HD 216956; HR 8728", "22 57 39.0", "-29 37 20", "129.81 ± 0.47", null, "1.17", "0.145"],
  ["Pollux", "β Geminorum", "HIP 37826; HD 62509; HR 2990", "07 45 18.9", "+28 01 34", "96.54 ± 0.27", null, "1.16", "0.991"],
  ["Denebola", "β Leonis", "HIP 57632; HD 102647; HR 4534", "11 49 03.6", "+14 34 19", "90.91 ± 0.52", null, "2.14", "0.090"],
  ["Arcturus", "α Bootis", "HIP 69673; HD 124897; HR 5340", "14 15 39.7", "+19 10 57", "88.83 ± 0.54", null, "-0.05", "1.239"],
  ["Capella", "α Aurigae", "HIP 24608; HD 34029; HR 1708", "05 16 41.4", "+45 59 53", "76.20 ± 0.46", null, "0.08", "0.795"],
  ["Castor", "α Geminorum", "HIP 36850; HD 60179; HR 2891", "07 34 36.0", "+31 53 18", "64.12 ± 3.75", null, "1.58", "0.034"],
  ["Aldebaran", "α Tauri; fr: Aldébaran", "HIP 21421; HD 29139; HR 1457", "04 35 55.2", "+16 30 33", "48.94 ± 0.77", null, "0.87", "1.538"],
  ["Regulus", "α Leonis; fr: Régulus", "HIP 49669; HD 87901; HR 3982", "10 08 22.3", "+11 58 02", "41.13 ± 0.35", null, "1.36", "-0.087"],
  ["Menkalinan", "β Aurigae", "HIP 28360; HD 40183; HR 2088", "05 59 31.7", "+44 56 51", "40.21 ± 0.23", null, "1.90", "0.077"],
  ["Achernar", "α Eridani", "HIP 7588; HD 10144; HR 472", "01 37 42.8", "-57 14 12", "23.39 ± 0.57", null, "0.45", "-0.158"],
  ["Canopus", "α Carinae", "HIP 30438; HD 45348; HR 2326", "06 23 57.1", "-52 41 44", "10.55 ± 0.56", null, "-0.62", "0.164"],
  ["Rigel", "β Orionis", "HIP 24436; HD 34085; HR 1713", "05 14 32.3", "-08 12 06", "3.78 ± 0.34", null, "0.18", "-0.030"],
  ["Betelgeuse", "α Orionis; fr: Bételgeuse", "HIP 27989; HD 39801; HR 2061", "05 55 10.3", "+07 24 25", "6.55 ± 0.83", null, "0.45", "1.500"],
  ["Spica", "α Virginis; fr: L’Épi", "HIP 65474; HD 116658; HR 5056", "13 25 11.6", "-11 09 41", "13.06 ± 0.70", null, "0.98", "-0.235"],
  ["Antares", "α Scorpii; fr: Antarès", "HIP 80763; HD 148478; HR 6134", "16 29 24.5", "-26 25 55", "5.89 ± 1.00", null, "1.06", "1.865"],
  ["Deneb", "α Cygni", "HIP 102098; HD 197345; HR 7924", "20 41 25.9", "+45 16 49", "2.31 ± 0.32", null, "1.25", "0.092"],
  ["Hadar", "β Centauri", "HIP 68702; HD 122451; HR 5267", "14 03 49.4", "-60 22 23", "8.32 ± 0.50", null, "0.61", "-0.231"],
  ["Mimosa", "β Crucis", "HIP 62434; HD 111123; HR 4853", "12 47 43.3", "-59 41 20", "11.71 ± 0.98", null, "1.25", "-0.238"],
  ["Gacrux", "γ Crucis", "HIP 61084; HD 108903; HR 4763", "12 31 09.9", "-57 06 48", "36.83 ± 0.18", null, "1.59", "1.600"],
  ["Adhara", "ε Canis Majoris", "HIP 33579; HD 52089; HR 2618", "06 58 37.5", "-28 58 20", "8.05 ± 0.14", null, "1.50", "-0.211"],
  ["Shaula", "λ Scorpii", "HIP 85927; HD 158926; HR 6527", "17 33 36.5", "-37 06 14", "5.71 ± 0.75", null, "1.62", "-0.231"],
  ["Bellatrix", "γ Orionis", "HIP 25336; HD 35468; HR 1790", "05 25 07.9", "+06 20 59", "12.92 ± 0.52", null, "1.64", "-0.224"],
  ["Elnath", "β Tauri", "HIP 25428; HD 35497; HR 1791", "05 26 17.5", "+28 36 27", "24.36 ± 0.34", null, "1.65", "-0.130"],
  ["Alnilam", "ε Orionis", "HIP 26311; HD 37128; HR 1903", "05 36 12.8", "-01 12 07", "1.65 ± 0.45", null, "1.69", "-0.184"],
  ["Alkaid", "η Ursae Majoris", "HIP 67301; HD 120315; HR 5191", "13 47 32.4", "+49 18 48", "31.38 ± 0.24", null, "1.85", "-0.099"],
  ["Alioth", "ε Ursae Majoris", "HIP 62956; HD 112185; HR 4905", "12 54 01.7", "+55 57 35", "39.51 ± 0.20", null, "1.76", "-0.022"],
  ["Merak", "β Ursae Majoris", "HIP 53910; HD 95418; HR 4295", "11 01 50.5", "+56 22 57", "40.90 ± 0.16", null, "2.34", "0.033"],
  ["Dubhe", "α Ursae Majoris", "HIP 54061; HD 95689; HR 4301", "11 03 43.7", "+61 45 04", "26.54 ± 0.48", null, "1.81", "1.061"],
  ["Phecda", "γ Ursae Majoris", "HIP 58001; HD 103287; HR 4554", "11 53 49.8", "+53 41 41", "39.21 ± 0.40", null, "2.41", "0.044"],
  ["Polaris", "α Ursae Minoris; fr: L’étoile Polaire", "HIP 11767; HD 8890; HR 424", "02 31 49.1", "+89 15 51", "7.54 ± 0.11", null, "1.97", "0.636"],
  ["Kochab", "β Ursae Minoris", "HIP 72607; HD 131873; HR 5563", "14 50 42.3", "+74 09 20", "24.91 ± 0.12", null, "2.07", "1.465"],
  ["Alphard", "α Hydrae", "HIP 46390; HD 81797; HR 3748", "09 27 35.2", "-08 39 31", "18.09 ± 0.18", null, "1.99", "1.440"],
  ["Hamal", "α Arietis", "HIP 9884; HD 12929; HR 617", "02 07 10.4", "+23 27 45", "49.56 ± 0.25", null, "2.01", "1.151"],
  ["Diphda", "β Ceti", "HIP 3419; HD 4128; HR 188", "00 43 35.4", "-17 59 12", "33.86 ± 0.16", null, "2.04", "1.019"],
  ["Mirach", "β Andromedae", "HIP 5447; HD 6860; HR 337", "01 09 43.9", "+35 37 14", "16.52 ± 0.56", null, "2.07", "1.576"],
  ["Alpheratz", "α Andromedae", "HIP 677; HD 358; HR 15", "00 08 23.3", "+29 05 26", "33.62 ± 0.35", null, "2.07", "-0.038"],
  ["Algol", "β Persei", "HIP 14576; HD 19356; HR 936", "03 08 10.1", "+40 57 20", "36.27 ± 1.40", null, "2.09", "-0.003"],
  ["Mirfak", "α Persei", "HIP 15863; HD 20902; HR 1017", "03 24 19.4", "+49 51 40", "6.44 ± 0.17", null, "1.79", "0.481"],
  ["Alcyone", "η Tauri", "HIP 17702; HD 23630; HR 1165", "03 47 29.1", "+24 06 18", "8.09 ± 0.42", null, "2.85", "-0.086"],
  ["Barnard's Star", "fr: L’étoile de Barnard", "HIP 87937; GJ 699", "17 57 48.5", "+04 41 36", "548.31 ± 1.51", "546.9759 ± 0.0401", "9.54", "1.570"],
  ["Tau Ceti", "τ Ceti", "HIP 8102; HD 10700; HR 509; GJ 71", "01 44 04.1", "-15 56 15", "273.96 ± 0.17", "273.8097 ± 0.1701", "3.49", "0.727"],
  ["Epsilon Eridani", "Ran; ε Eridani", "HIP 16537; HD 22049; HR 1084; GJ 144", "03 32 55.8", "-09 27 30", "310.94 ± 0.16", "310.5773 ± 0.1355", "3.72", "0.881"],
  ["82 Eridani", "", "HIP 15510; HD 20794; HR 1008; GJ 139", "03 19 55.7", "-43 04 11", "165.47 ± 0.19", null, "4.26", "0.711"],
  ["40 Eridani A", "Keid; ο² Eridani", "HIP 19849; HD 26965; HR 1325; GJ 166 A", "04 15 16.3", "-07 39 10", "200.62 ± 0.23", null, "4.43", "0.820"],
  ["Groombridge 34 A", "", "HIP 1475; HD 1326; GJ 15 A", "00 18 22.9", "+44 01 23", "278.76 ± 0.77", "280.7068 ± 0.0203", "8.09", "1.560"],
  ["70 Ophiuchi", "", "HIP 88601; HD 165341; HR 6752; GJ 702", "18 05 27.3", "+02 30 00", "196.72 ± 0.83", null, "4.03", "0.860"],
  ["Sigma Draconis", "Alsafi; σ Draconis", "HIP 96100; HD 185144; HR 7462; GJ 764", "19 32 21.6", "+69 39 40", "173.77 ± 0.18", null, "4.67", "0.786"],
  ["Eta Cassiopeiae", "Achird; η Cassiopeiae", "HIP 3821; HD 4614; HR 219; GJ 34", "00 49 06.3", "+57 48 55", "167.98 ± 0.48", null, "3.46", "0.587"],
  ["Delta Pavonis", "δ Pavonis", "HIP 99240; HD 190248; HR 7665; GJ 780", "20 08 43.6", "-66 10 55", "163.71 ± 0.17", null, "3.55", "0.751"],
  ["van Maanen's Star", "fr: L’étoile de van Maanen", "HIP 3829; GJ 35", "00 49 09.9", "+05 23 19", "234.60 ± 5.90", "231.7800 ± 0.0183", "12.37", "0.554"],
  ["Beta Hydri", "β Hydri", "HIP 2021; HD 2151; HR 98; GJ 19", "00 25 45.1", "-77 15 15", "134.07 ± 0.11", null, "2.82", "0.618"],
  ["Pi3 Orionis", "Tabit; π³ Orionis", "HIP 22449; HD 30652; HR 1543; GJ 178", "04 49 50.4", "+06 57 41", "123.94 ± 0.17", null, "3.19", "0.484"],
  ["Alderamin", "α Cephei", "HIP 105199; HD 203280; HR 8162", "21 18 34.8", "+62 35 08", "66.50 ± 0.11", null, "2.45", "0.257"],
  ["Rasalhague", "α Ophiuchi", "HIP 86032; HD 159561; HR 6556", "17 34 56.1", "+12 33 36", "67.13 ± 1.06", null, "2.08", "0.155"],
  ["Eltanin", "γ Draconis", "HIP 87833; HD 164058; HR 6705", "17 56 36.4", "+51 29 20", "21.14 ± 0.10", null, "2.24", "1.521"],
  ["Alphecca", "α Coronae Borealis", "HIP 76267; HD 139006; HR 5793", "15 34 41.3", "+26 42 53", "43.46 ± 0.28", null, "2.22", "0.032"],
  ["Nunki", "σ Sagittarii", "HIP 92855; HD 175191; HR 7121", "18 55 15.9", "-26 17 48", "14.32 ± 0.29", null, "2.05", "-0.134"],
  ["Kaus Australis", "ε Sagittarii", "HIP 90185; HD 169022; HR 6879", "18 24 10.3", "-34 23 05", "22.76 ± 0.24", null, "1.79", "-0.031"],
  ["Alnair", "α Gruis", "HIP 109268; HD 209952; HR 8425", "22 08 14.0", "-46 57 40", "32.29 ± 0.21", null, "1.73", "-0.070"],
  ["Miaplacidus", "β Carinae", "HIP 45238; HD 80007; HR 3685", "09 13 12.0", "-69 43 02", "28.82 ± 0.11", null, "1.67", "0.070"],
  ["Alhena", "γ Geminorum", "HIP 31681; HD 47105; HR 2421", "06 37 42.7", "+16 23 57", "29.84 ± 2.23", null, "1.93", "0.001"],
  ["Saiph", "κ Orionis", "HIP 27366; HD 38771; HR 2004", "05 47 45.4", "-09 40 11", "5.04 ± 0.22", null, "2.07", "-0.168"],
  ["Scheat", "β Pegasi", "HIP 113881; HD 217906; HR 8775", "23 03 46.5", "+28 04 58", "16.64 ± 0.15", null, "2.44", "1.655"],
  ["Markab", "α Pegasi", "HIP 113963; HD 218045; HR 8781", "23 04 45.7", "+15 12 19", "24.46 ± 0.19", null, "2.49", "-0.002"],
  ["Enif", "ε Pegasi", "HIP 107315; HD 206778; HR 8308", "21 44 11.2", "+09 52 30", "4.73 ± 0.17", null, "2.38", "1.520"],
  ["Schedar", "α Cassiopeiae", "HIP 3179; HD 3712; HR 168", "00 40 30.4", "+56 32 14", "14.29 ± 0.15", null, "2.24", "1.170"],
  ["Caph", "β Cassiopeiae", "HIP 746; HD 432; HR 21", "00 09 10.7", "+59 08 59", "59.58 ± 0.38", null, "2.28", "0.380"],
  ["Sadr", "γ Cygni", "HIP 100453; HD 194093; HR 7796", "20 22 13.7", "+40 15 24", "1.78 ± 0.27", null, "2.23", "0.673"],
  ["Mintaka", "δ Orionis", "HIP 25930; HD 36486; HR 1852", "05 32 00.4", "-00 17 57", "4.71 ± 0.58", null, "2.25", "-0.175"],
  ["GJ 1", "", "HIP 439; HD 225213; GJ 1", "00 05 24.4", "-37 21 27", "230.42 ± 0.90", "230.0970 ± 0.0362", "8.56", "1.462"],
];

/** In no public copy that was at hand: these stay "from memory", and so drafts. */
// biome-ignore format: one star a line
const FROM_MEMORY: Row[] = [
  ["Proxima Centauri", "α Centauri C; fr: Proxima du Centaure", "HIP 70890; GJ 551", "14 29 42.9", "-62 40 46", "771.64 ± 2.60", "768.0665 ± 0.0499", "11.01", "1.807"],
  ["Rigil Kentaurus", "α Centauri A", "HIP 71683; HD 128620; HR 5459; GJ 559 A", "14 39 36.5", "-60 50 02", "754.81 ± 4.11", null, "-0.01", "0.710"],
  ["Toliman", "α Centauri B", "HIP 71681; HD 128621; HR 5460; GJ 559 B", "14 39 35.1", "-60 50 14", "796.92 ± 25.90", null, "1.35", "0.900"],
  ["Lalande 21185", "", "HIP 54035; HD 95735; GJ 411", "11 03 20.2", "+35 58 12", "392.64 ± 0.67", "392.7529 ± 0.0321", "7.49", "1.502"],
  ["Ross 154", "", "HIP 92403; GJ 729", "18 49 49.4", "-23 50 10", "336.72 ± 2.03", "336.0266 ± 0.0317", "10.37", "1.510"],
  ["Ross 128", "", "HIP 57548; GJ 447", "11 47 44.4", "+00 48 16", "298.04 ± 2.30", "296.3053 ± 0.0302", "11.12", "1.746"],
  ["61 Cygni A", "", "HIP 104214; HD 201091; HR 8085; GJ 820 A", "21 06 53.9", "+38 44 58", "286.82 ± 6.78", "285.9949 ± 0.0599", "5.20", "1.069"],
  ["Epsilon Indi", "ε Indi", "HIP 108870; HD 209100; HR 8387; GJ 845", "22 03 21.7", "-56 47 10", "276.06 ± 0.28", "274.8431 ± 0.0956", "4.69", "1.056"],
  ["Mizar", "ζ Ursae Majoris", "HIP 65378; HD 116656; HR 5054", "13 23 55.5", "+54 55 31", "38.01 ± 1.71", null, "2.23", "0.057"],
  ["Megrez", "δ Ursae Majoris", "HIP 59774; HD 106591; HR 4660", "12 15 25.6", "+57 01 57", "40.51 ± 0.15", null, "3.32", "0.077"],
  ["Acrux", "α Crucis", "HIP 60718; HD 108248; HR 4730", "12 26 35.9", "-63 05 57", "10.13 ± 0.50", null, "0.77", "-0.243"],
  ["Alnitak", "ζ Orionis", "HIP 26727; HD 37742; HR 1948", "05 40 45.5", "-01 56 34", "4.43 ± 0.64", null, "1.74", "-0.199"],
  ["61 Cygni B", "", "HIP 104217; HD 201092; HR 8086; GJ 820 B", "21 06 55.3", "+38 44 31", "285.88 ± 0.54", "286.0054 ± 0.0289", "6.05", "1.309"],
  ["Lacaille 9352", "", "HIP 114046; HD 217987; GJ 887", "23 05 52.0", "-35 51 11", "305.26 ± 0.70", "304.1354 ± 0.0200", "7.35", "1.483"],
  ["Wolf 359", "CN Leonis", "GJ 406", "10 56 28.9", "+07 00 53", null, "415.1794 ± 0.0684", "13.5", "2.0"],
  ["Ross 248", "HH Andromedae", "GJ 905", "23 41 55.0", "+44 10 39", null, "316.4812 ± 0.0444", "12.3", "1.9"],
  ["Groombridge 34 B", "", "GJ 15 B", "00 18 25.8", "+44 01 38", null, "280.6947 ± 0.0268", "11.1", "1.8"],
  ["Struve 2398 A", "", "HIP 91768; HD 173739; GJ 725 A", "18 42 46.7", "+59 37 49", null, "283.8401 ± 0.0281", "8.9", "1.50"],
  ["Struve 2398 B", "", "HIP 91772; HD 173740; GJ 725 B", "18 42 46.9", "+59 37 37", null, "283.8378 ± 0.0323", "9.7", "1.56"],
  ["YZ Ceti", "", "HIP 5643; GJ 54.1", "01 12 30.6", "-16 59 56", null, "269.0573 ± 0.0337", "12.1", "1.8"],
  ["Luyten's Star", "fr: L’étoile de Luyten", "HIP 36208; GJ 273", "07 27 24.5", "+05 13 33", null, "264.1270 ± 0.0413", "9.9", "1.57"],
  ["Teegarden's Star", "fr: L’étoile de Teegarden", "", "02 53 00.9", "+16 52 53", null, "260.9884 ± 0.0934", "15.1", null],
  ["Kapteyn's Star", "VZ Pictoris; fr: L’étoile de Kapteyn", "HIP 24186; HD 33793; GJ 191", "05 11 40.6", "-45 01 06", null, "254.1986 ± 0.0168", "8.86", "1.54"],
  ["Lacaille 8760", "AX Microscopii", "HIP 105090; HD 202560; GJ 825", "21 17 15.3", "-38 52 03", null, "251.9124 ± 0.0352", "6.7", "1.40"],
  ["Wolf 1061", "", "HIP 80824; GJ 628", "16 30 18.1", "-12 39 45", null, "232.1390 ± 0.0268", "10.1", "1.6"],
];

const star =
  (checked: boolean) =>
  ([name, also, ids, ra, dec, hipparcos, gaia, v, bv]: Row): SeedStar => ({
    name,
    also,
    ids,
    ra,
    dec,
    hipparcos,
    gaia,
    v,
    bv,
    checked,
  });

export const STARS: SeedStar[] = [...CHECKED.map(star(true)), ...FROM_MEMORY.map(star(false))];
