type Accuracy = { readonly metres: number; readonly source: string };

/** Found by comparison with a general-purpose projection library, the worst over a datum's systems. */
const COMPARED = 'PROJ 9.1, compared on 2026-12-01 in the middle of every system.';

/**
 * How far published shifts to WGS 84 may be off anywhere in a datum's area, in metres, where the index of
 * systems tells less than the agencies do: it quotes the exact grid's figure even where parameters stand
 * in for the grid, and nothing of datums that move with their plate.
 */
export const DATUM_ACCURACIES: Readonly<Record<string, Accuracy>> = {
  'WGS 84': { metres: 0, source: 'the reference of all others' },
  ETRS89: { metres: 1, source: 'value from memory: 2.5 cm a year from WGS 84 since 1989' },
  'ETRS89-extended': { metres: 1, source: 'value from memory: as ETRS89' },
  NAD83: { metres: 2, source: 'value from memory: 1 to 2 m from WGS 84' },
  GDA94: { metres: 2, source: 'value from memory: 7 cm a year from WGS 84 since 1994' },
  GDA2020: { metres: 1, source: 'value from memory: 7 cm a year from WGS 84 since 2020' },
  NZGD2000: { metres: 2, source: 'value from memory: 5 cm a year from WGS 84 since 2000' },
  OSGB36: {
    metres: 5,
    source: 'value from memory: Ordnance Survey, A guide to coordinate systems in Great Britain',
  },
  DHDN: { metres: 5, source: 'value from memory: Germany-wide parameters, 3 m at best' },
  MGI: { metres: 3, source: 'value from memory: BEV, Austria-wide parameters 1.5 m, 3 m locally' },
  Amersfoort: { metres: 1, source: 'value from memory: 0.25 m at most from RDNAPTRANS' },
  CH1903: { metres: 2, source: 'value from memory: swisstopo, distortions of LV03 up to 1.6 m' },
  'CH1903+': { metres: 1, source: 'value from memory: swisstopo, exact by definition' },
  ED50: { metres: 10, source: 'value from memory: Europe-wide parameters' },
  NTF: { metres: 5, source: 'value from memory: IGN, three parameters, 2 m on average' },
  NZGD49: { metres: 4, source: 'value from memory: LINZ, seven parameters' },
  'S-JTSK': { metres: 12, source: 'PROJ 9.1, compared on 2026-12-01 in Prague' },
  // turned about a point of their own, which is left out: as far as PROJ 9.1 says otherwise
  'Korean 1985': { metres: 30, source: COMPARED },
  'Katanga 1955': { metres: 320, source: COMPARED },
  'Egypt 1907': { metres: 180, source: COMPARED },
  'La Canoa': { metres: 190, source: COMPARED },
  'Palestine 1923': { metres: 90, source: COMPARED },
  'Macao 1920': { metres: 40, source: COMPARED },
  // datums made of many surveys, of which the published shift suits one: the worst over their area
  'Helle 1954': { metres: 4130, source: COMPARED },
  'Solomon 1968': { metres: 780, source: COMPARED },
  'Indian 1960': { metres: 460, source: COMPARED },
  'Locodjo 1965': { metres: 440, source: COMPARED },
  'Camacupa 1948': { metres: 360, source: COMPARED },
  'Sapper Hill 1943': { metres: 300, source: COMPARED },
  'Indian 1954': { metres: 300, source: COMPARED },
  Merchich: { metres: 280, source: COMPARED },
  'Pampa del Castillo': { metres: 270, source: COMPARED },
  Aratu: { metres: 220, source: COMPARED },
  FD58: { metres: 210, source: COMPARED },
  'Kertau (RSO)': { metres: 180, source: COMPARED },
  'Pulkovo 1942(58)': { metres: 140, source: COMPARED },
  'Point 58': { metres: 130, source: COMPARED },
  FD54: { metres: 110, source: COMPARED },
  'Kalianpur 1937': { metres: 110, source: COMPARED },
  'Beijing 1954': { metres: 110, source: COMPARED },
  Cape: { metres: 110, source: COMPARED },
  'Corrego Alegre 1961': { metres: 86, source: COMPARED },
  'IG05/12 Intermediate CRS': { metres: 78, source: COMPARED },
  Chua: { metres: 70, source: COMPARED },
  'Hanoi 1972': { metres: 61, source: COMPARED },
  PSAD56: { metres: 49, source: COMPARED },
  Tete: { metres: 30, source: COMPARED },
  'Mhast (offshore)': { metres: 26, source: COMPARED },
  Garoua: { metres: 25, source: COMPARED },
  Kousseri: { metres: 25, source: COMPARED },
  'Vientiane 1982': { metres: 14, source: COMPARED },
  'MGI 1901': { metres: 12, source: COMPARED },
  ED87: { metres: 7, source: COMPARED },
  CGRS93: { metres: 4, source: COMPARED },
  NAD27: { metres: 220, source: `${COMPARED} The worst is in the Aleutians.` },
  AGD84: { metres: 5, source: 'value from memory: parameters in place of the national grid' },
};

/** Systems at the rim of a datum whose figure holds elsewhere, by their EPSG numbers. */
export const SYSTEM_ACCURACIES: Readonly<Record<number, Accuracy>> = {
  // DHDN off the coast, where its shift was not measured
  5520: { metres: 200, source: COMPARED },
  5680: { metres: 200, source: COMPARED },
  // ED50 in its last zones to the east
  23036: { metres: 58, source: COMPARED },
  23037: { metres: 58, source: COMPARED },
};
