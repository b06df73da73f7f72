import { LARGEST_VOLUME_LOSS } from '../../shared/assessment/breakpoint-of-wall.ts';
import { ASSUMED } from '../../shared/building/assumed-attributes.ts';
import { CAUTIONS, VALIDITY } from '../../shared/cautions.ts';
import { percentFromRatio } from '../../shared/units/percent-from-ratio.ts';
import { crsOfScheme } from '../crs/crs-of-scheme.ts';
import type { FoundRun } from '../models/find-runs.ts';
import type { Run } from '../models/run.ts';
import type { Scheme } from '../models/scheme.ts';
import { aboutDesign } from './about-design.ts';
import { aboutRules } from './about-rules.ts';
import type { ExportAbout } from './export-file.ts';
import { momentWords } from './moment-words.ts';

const UNITS = {
  xlsx: 'As in the headings. Settlement and tension are positive.',
  geojson:
    'Metres; metres per metre for strains, slopes, ratios and volume losses. Settlement and tension are positive. Corners in longitude and latitude, WGS 84.',
} as const;

const MEANINGS: ExportAbout = [
  ['Settlement and slope', 'The largest over the whole bracket, at founding level.'],
  [
    'Strain',
    'The largest tensile strain of all walls: at the central value, and the least and most over the bracket.',
  ],
  ['Category', 'By strain, which cannot tell 4 from 5. Empty where screening lets a building go.'],
  [
    'Breakpoint',
    `The factor on all central volume losses at which the category that leads on is reached; empty where it is not up to a volume loss of ${percentFromRatio(LARGEST_VOLUME_LOSS)} %. The reserve is what it is over 1.`,
  ],
  ['Decision', 'For the option, as it stood when this was exported; later than the run.'],
  [
    'Assumed',
    `What nobody gave: founded ${ASSUMED.foundingDepth} m below ground, ${ASSUMED.storeys} storeys, ${ASSUMED.storeyHeight} m a storey to the eaves, E/G ${ASSUMED.eOverG}, Poisson’s ratio ${ASSUMED.poisson}, the ground level beside the nearest drive. Where only the construction is known, E/G and Poisson’s ratio follow from it.`,
  ],
];

function inputs(run: FoundRun): ExportAbout {
  return [
    ['Run', run.number],
    ['Option', `${run.optionName}, version ${run.alignmentVersion}`],
    ['Started', momentWords(run.startedAt)],
    ['Started by', run.startedBy ?? 'the system'],
    ['Method version', run.methodVersion],
    ['Rules version', run.rulesVersion],
    ['Register version', run.registerVersion],
    ['Buildings', run.buildings],
  ];
}

/** What a run says of itself: what it went by, how its figures are meant, and how far they hold. */
export async function aboutRun(
  scheme: Scheme,
  run: FoundRun,
  { design, rules }: Pick<Run, 'design' | 'rules'>,
  format: keyof typeof UNITS,
): Promise<ExportAbout> {
  const { name, code } = await crsOfScheme(scheme);
  return [
    ...inputs(run),
    ['Grid', `${name}, EPSG:${code}; levels in metres above the scheme’s datum`],
    ['Units', UNITS[format]],
    ...MEANINGS,
    ...aboutDesign(design),
    ...aboutRules(rules),
    ['How far it holds', VALIDITY.join(' ')],
    ['Cautions', CAUTIONS.join(' ')],
  ];
}
