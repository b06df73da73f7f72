/**
 * How far published shifts to WGS 84 may be off anywhere in a datum's area, in metres, where the index of
 * systems tells less than the agencies do: it quotes the exact grid's figure even where parameters stand
 * in for the grid, and nothing of datums that move with their plate.
 */
export const DATUM_ACCURACIES: Readonly<
  Record<string, { readonly metres: number; readonly source: string }>
> = {
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
  NAD27: { metres: 10, source: 'value from memory: parameters in place of NADCON' },
  NZGD49: { metres: 4, source: 'value from memory: LINZ, seven parameters' },
  'S-JTSK': { metres: 12, source: 'PROJ 9.1, compared on 2026-12-01 in Prague' },
  // turned about a point of their own, which is left out: as far as PROJ 9.1 says otherwise
  'Korean 1985': { metres: 30, source: 'PROJ 9.1, compared on 2026-12-01' },
  'Katanga 1955': { metres: 320, source: 'PROJ 9.1, compared on 2026-12-01' },
  'Egypt 1907': { metres: 180, source: 'PROJ 9.1, compared on 2026-12-01' },
  'La Canoa': { metres: 190, source: 'PROJ 9.1, compared on 2026-12-01' },
  'Palestine 1923': { metres: 90, source: 'PROJ 9.1, compared on 2026-12-01' },
  'Macao 1920': { metres: 40, source: 'PROJ 9.1, compared on 2026-12-01' },
  AGD84: { metres: 5, source: 'value from memory: parameters in place of the national grid' },
};
