import type { Category } from '../damage/categories.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { capital } from './capital.ts';
import { everydayLength } from './everyday-length.ts';

/**
 * What a run found of a building, as far as its owner is told of it.
 *
 * Units: m; `settlement` is the central one along the walls, `most` the largest over the range that was
 * looked at, `depth` from the ground to the top of the nearest tunnel, `distance` in plan from the building to
 * the side of that tunnel. Valid: settlement and categories are null where the ground moves too little for
 * them to be worked out; distance is 0 where the tunnel passes underneath. Source: [own].
 */
export type OwnerFacts = {
  readonly settlement: number | null;
  readonly most: number;
  readonly categoryLow: Category | null;
  readonly category: Category | null;
  readonly categoryHigh: Category | null;
  readonly tunnels: number;
  readonly depth: number;
  readonly distance: number;
};

/**
 * What an owner's building is called.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export type OwnerPlace = 'home' | 'building';

/** Houses are for living in but for those that are called otherwise too, as public ones. */
const HOMES =
  /^((detached|semi-detached|terraced|town|row)? ?houses?)$|home|\bflats?\b|dwell|residen|cottage|apartment/i;

/**
 * Whether people live in a building, by what it is used for.
 *
 * Units: none. Valid: a building where the use is unknown. Source: [own].
 */
export function ownerPlace(use: string | null): OwnerPlace {
  return use !== null && HOMES.test(use) ? 'home' : 'building';
}

const EXPECTED: readonly [string, string, string, string, string] = [
  'is expected to stay as it is',
  'is expected to stay sound, with hairline cracks',
  'is expected to stay sound, with cracks that are easy to fill',
  'is expected to need some repairs',
  'needs to be made safe before we tunnel',
];

/** Where no worse is to be expected over the whole range, cracks are told as the most there will be. */
const AT_MOST: readonly Category[] = [1, 2];

/**
 * What is expected of a building, in one sentence without its stop.
 *
 * Units: as OwnerFacts. Valid: any result that was worked out. Source: [own], after the ease of repair in
 * burland-broms-de-mello-1977.
 */
export function ownerHeadline(
  { category, categoryHigh }: Pick<OwnerFacts, 'category' | 'categoryHigh'>,
  place: OwnerPlace,
): string {
  const central = category ?? 0;
  const isMost = AT_MOST.includes(central) && (categoryHigh ?? central) <= central;
  return `Your ${place} ${EXPECTED[central]}${isMost ? ' at most' : ''}`;
}

const LOOKS: readonly [string, string, string, string, string] = [
  'You are not likely to notice anything.',
  'You may see hairline cracks in plaster. They can be filled when you next decorate.',
  'You may see cracks in plaster, and a few in outside walls. They are easy to fill. A door or a window may need easing.',
  'We expect cracks that a builder has to mend. Doors and windows may stick, and a pipe may need work. We plan how to keep this small.',
  'We expect damage that must be repaired. The building has to be protected first. We talk with you about how that can be done.',
];

/**
 * What the damage could look like. Who repairs it and who pays is the promoter's to say.
 *
 * Units: none. Valid: null where too little moves for a category. Source: [own], after the ease of repair in
 * burland-broms-de-mello-1977.
 */
export function ownerLooks(category: Category | null): string {
  return LOOKS[category ?? 0];
}

const CRACKS: readonly [string, string, string, string] = [
  'As fine as a hair',
  'About as thin as the edge of a fingernail',
  'Up to half as wide as a fingernail',
  'Up to as wide as a fingernail',
];

/**
 * How wide a crack may be, beside a fingernail.
 *
 * Units: none. Valid: null where no picture helps: nothing to see, or more than a picture can say.
 * Source: crack widths burland-broms-de-mello-1977; a nail is some 0.5 mm thick and 11 mm wide, [own].
 */
export function crackCaption(category: Category | null): string | null {
  return category === null || category === 4 ? null : CRACKS[category];
}

/**
 * What of a building stays usable.
 *
 * Units: none. Valid: null where too little moves for a category. Source: [own], after the ease of repair in
 * burland-broms-de-mello-1977.
 */
export function staysUsable(category: Category | null, place: OwnerPlace): string {
  const stay = place === 'home' ? 'You can stay at home throughout.' : 'You can use it throughout.';
  const central = category ?? 0;
  if (central <= 1) return `Doors and windows go on opening. ${stay}`;
  if (central === 2) return `A door or a window may stick a little. ${stay}`;
  if (central === 3)
    return 'You may have to leave a room free while repairs are made. We talk with you beforehand about when that suits you.';
  return 'We agree with you beforehand what you can use, and when. If you need another place for a time, please talk to us.';
}

/**
 * So many millimetres in words, as "about 44 millimetres".
 *
 * Units: m. Valid: 0 and more. Source: [own].
 */
export function millimetreWords(metres: number): string {
  const whole = Math.round(millimetresFromMetres(metres));
  if (millimetresFromMetres(metres) < 1) return 'less than 1 millimetre';
  return whole === 1 ? 'about 1 millimetre' : `about ${whole} millimetres`;
}

function metreWords(metres: number): string {
  const step = metres < 20 ? 1 : 5;
  const whole = Math.max(1, step * Math.round(metres / step));
  return whole === 1 ? 'about 1 metre' : `about ${whole} metres`;
}

/** Farther off, where a tunnel is does not help to understand what it does. */
const BESIDE = 2;

function whereWords({ tunnels, depth, distance }: OwnerFacts, place: OwnerPlace): string {
  const what = tunnels === 1 ? 'a tunnel' : tunnels === 2 ? 'two tunnels' : `${tunnels} tunnels`;
  const under = tunnels === 1 ? 'under' : 'under or beside';
  const where =
    distance < BESIDE ? `${under} your ${place}` : `${metreWords(distance)} from your ${place}`;
  return `${capital(what)} will pass ${where}, ${metreWords(depth)} down.`;
}

/**
 * How much the ground sinks, beside something from everyday life.
 *
 * Units: as OwnerFacts. Valid: any result that was worked out; that it takes weeks is [common].
 * Source: [own].
 */
export function movementWords({
  settlement,
  most,
}: Pick<OwnerFacts, 'settlement' | 'most'>): string {
  const by = settlement ?? most;
  const millimetres = millimetresFromMetres(by);
  if (millimetres < 1)
    return 'The ground will sink by less than 1 millimetre. That is too little to feel.';
  const how = settlement === null ? `${millimetreWords(by)} at most` : millimetreWords(by);
  return `The ground will sink by ${how}, slowly, over a few weeks. That is ${everydayLength(millimetres)}.`;
}

/**
 * The one paragraph that an owner reads: where the tunnel is, how much moves, what that could look like.
 *
 * Units: as OwnerFacts. Valid: any result that was worked out. Source: [own].
 */
export function ownerParagraph(facts: OwnerFacts, place: OwnerPlace): string {
  return [whereWords(facts, place), movementWords(facts), ownerLooks(facts.category)].join(' ');
}
