/**
 * A cited work.
 *
 * Units: none. Valid: bibliographic data set down from memory, to be confirmed against the printed
 * work before it is quoted. Source: [own].
 */
export type Reference = {
  readonly authors: string;
  readonly year: number;
  readonly title: string;
  readonly where: string;
};

/**
 * Every work that the method cites, each once, by the key that doc blocks and workings use.
 *
 * Units: none. Valid: closed list. Source: see the parts.
 */
export const REFERENCES = {
  'abramowitz-stegun-1964': {
    authors: 'Abramowitz, M. and Stegun, I. A. (editors)',
    year: 1964,
    title: 'Handbook of mathematical functions',
    where: 'National Bureau of Standards, Applied Mathematics Series 55',
  },
  'attewell-woodman-1982': {
    authors: 'Attewell, P. B. and Woodman, J. P.',
    year: 1982,
    title:
      'Predicting the dynamics of ground settlement and its derivatives caused by tunnelling in soil',
    where: 'Ground Engineering 15(8), 13–22 and 36',
  },
  'bitetti-2010': {
    authors: 'Bitetti, B.',
    year: 2010,
    title: 'Effects of tunnelling in urban areas',
    where: 'PhD thesis, Università di Napoli Federico II (c. 2010)',
  },
  'boscardin-cording-1989': {
    authors: 'Boscardin, M. D. and Cording, E. J.',
    year: 1989,
    title: 'Building response to excavation-induced settlement',
    where: 'Journal of Geotechnical Engineering, ASCE, 115(1), 1–21',
  },
  'burland-1995': {
    authors: 'Burland, J. B.',
    year: 1995,
    title: 'Assessment of risk of damage to buildings due to tunnelling and excavation',
    where:
      'First International Conference on Earthquake Geotechnical Engineering, Tokyo, 1189–1201',
  },
  'burland-broms-de-mello-1977': {
    authors: 'Burland, J. B., Broms, B. B. and de Mello, V. F. B.',
    year: 1977,
    title: 'Behaviour of foundations and structures',
    where:
      'Ninth International Conference on Soil Mechanics and Foundation Engineering, Tokyo, 2, 495–546',
  },
  'burland-wroth-1974': {
    authors: 'Burland, J. B. and Wroth, C. P.',
    year: 1974,
    title: 'Settlement of buildings and associated damage',
    where: 'Conference on Settlement of Structures, Cambridge, 611–654',
  },
  'common-practice': {
    authors: 'Common practice',
    year: 0,
    title: 'Used in the trade; no source',
    where: 'no source',
  },
  'dowell-jarratt-1971': {
    authors: 'Dowell, M. and Jarratt, P.',
    year: 1971,
    title: 'A modified regula falsi method for computing the root of an equation',
    where: 'BIT 11, 168–174',
  },
  'farouki-2012': {
    authors: 'Farouki, R. T.',
    year: 2012,
    title: 'The Bernstein polynomial basis: a centennial retrospective',
    where: 'Computer Aided Geometric Design 29(6), 379–419',
  },
  'fritsch-carlson-1980': {
    authors: 'Fritsch, F. N. and Carlson, R. E.',
    year: 1980,
    title: 'Monotone piecewise cubic interpolation',
    where: 'SIAM Journal on Numerical Analysis 17(2), 238–246',
  },
  'iso-paper-2007': {
    authors: 'International Organization for Standardization',
    year: 2007,
    title: 'Writing paper and certain classes of printed matter: trimmed sizes, A and B series',
    where: 'ISO 216',
  },
  'iso-title-blocks-2004': {
    authors: 'International Organization for Standardization',
    year: 2004,
    title: 'Technical product documentation: data fields in title blocks and document headers',
    where: 'ISO 7200',
  },
  'mair-taylor-1997': {
    authors: 'Mair, R. J. and Taylor, R. N.',
    year: 1997,
    title: 'Bored tunnelling in the urban environment',
    where:
      'Fourteenth International Conference on Soil Mechanics and Foundation Engineering, Hamburg, 4, 2353–2385',
  },
  'mair-taylor-bracegirdle-1993': {
    authors: 'Mair, R. J., Taylor, R. N. and Bracegirdle, A.',
    year: 1993,
    title: 'Subsurface settlement profiles above tunnels in clays',
    where: 'Géotechnique 43(2), 315–320',
  },
  'mair-taylor-burland-1996': {
    authors: 'Mair, R. J., Taylor, R. N. and Burland, J. B.',
    year: 1996,
    title:
      'Prediction of ground movements and assessment of risk of building damage due to bored tunnelling',
    where: 'Geotechnical Aspects of Underground Construction in Soft Ground, London, 713–718',
  },
  'mckay-beckman-conover-1979': {
    authors: 'McKay, M. D., Beckman, R. J. and Conover, W. J.',
    year: 1979,
    title:
      'A comparison of three methods for selecting values of input variables in the analysis of output from a computer code',
    where: 'Technometrics 21(2), 239–245',
  },
  'neumaier-1974': {
    authors: 'Neumaier, A.',
    year: 1974,
    title: 'Rundungsfehleranalyse einiger Verfahren zur Summation endlicher Summen',
    where: 'Zeitschrift für Angewandte Mathematik und Mechanik 54, 39–51',
  },
  'new-oreilly-1991': {
    authors: "New, B. M. and O'Reilly, M. P.",
    year: 1991,
    title: 'Tunnelling induced ground movements: predicting their magnitude and effects',
    where: 'Fourth International Conference on Ground Movements and Structures, Cardiff, 671–697',
  },
  'oneill-2014': {
    authors: "O'Neill, M. E.",
    year: 2014,
    title:
      'PCG: a family of simple fast space-efficient statistically good algorithms for random number generation',
    where: 'Harvey Mudd College, Computer Science Department, HMC-CS-2014-0905',
  },
  'oreilly-new-1982': {
    authors: "O'Reilly, M. P. and New, B. M.",
    year: 1982,
    title: 'Settlements above tunnels in the United Kingdom: their magnitude and prediction',
    where: "Tunnelling '82, London, 173–181",
  },
  own: {
    authors: 'This project',
    year: 2026,
    title: 'Derived here',
    where: 'the doc block of the function and the verification table in DEVELOPERS.md',
  },
  'rankin-1988': {
    authors: 'Rankin, W. J.',
    year: 1988,
    title: 'Ground movements resulting from urban tunnelling: predictions and effects',
    where: 'Engineering Geology of Underground Movements, London, 79–92',
  },
  'taylor-1995': {
    authors: 'Taylor, R. N.',
    year: 1995,
    title: 'Tunnelling in soft ground in the UK',
    where: 'Underground Construction in Soft Ground, New Delhi, 123–126',
  },
  'trefethen-2013': {
    authors: 'Trefethen, L. N.',
    year: 2013,
    title: 'Approximation theory and approximation practice',
    where: 'Society for Industrial and Applied Mathematics, Philadelphia',
  },
} as const satisfies Record<string, Reference>;

/**
 * The key of a cited work.
 *
 * Units: none. Valid: a key of REFERENCES. Source: [own].
 */
export type ReferenceKey = keyof typeof REFERENCES;
