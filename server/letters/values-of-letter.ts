import { certaintyWords, OWNER_CAUTIONS } from '../../shared/presentation/owner-certainty.ts';
import { ownerDecisionWords } from '../../shared/presentation/owner-decision.ts';
import {
  movementWords,
  ownerLooks,
  ownerPlace,
  staysUsable,
  type OwnerFacts,
} from '../../shared/presentation/owner-words.ts';
import type { LetterValues } from '../../shared/presentation/letter-text.ts';
import type { LetterSettings } from '../../shared/schemas/letter-settings.ts';
import { nearDayInWords } from '../mail/letters/day-in-words.ts';
import type { Told } from '../models/find-told.ts';

/** A building with what its owner is told of it; null where a run has not found anything yet. */
export type ToldBuilding = { readonly building: Told; readonly facts: OwnerFacts | null };

type About = {
  readonly name: string;
  readonly scheme: string;
  readonly answerBy: string;
  readonly settings: LetterSettings;
  readonly buildings: readonly ToldBuilding[];
};

const NOT_YET = 'We have not worked out yet how much the ground moves here. We will write again.';

function where({ address, name, reference }: Told): string {
  return address ?? name ?? reference;
}

function worse(one: ToldBuilding, other: ToldBuilding): ToldBuilding {
  const [a, b] = [one.facts, other.facts];
  if (a === null || b === null) return a === null ? other : one;
  const [ca, cb] = [a.categoryHigh ?? -1, b.categoryHigh ?? -1];
  if (ca !== cb) return ca > cb ? one : other;
  return a.most >= b.most ? one : other;
}

/** Of several buildings the one that is affected most is told of, and it is said that it is that one. */
function foundWords(buildings: readonly ToldBuilding[]) {
  const [first, ...others] = buildings;
  if (first === undefined) return { movement: '', looks: '', stays: '', sure: '' };
  const most = others.reduce(worse, first);
  const { facts, building } = most;
  if (facts === null) return { movement: NOT_YET, looks: '', stays: '', sure: '' };
  const place = ownerPlace(building.use);
  const which =
    others.length === 0 ? '' : `What follows is for ${where(building)}, where most moves. `;
  return {
    movement: `${which}${movementWords(facts)}`,
    looks: ownerLooks(facts.category),
    stays: staysUsable(facts.category, place),
    sure: certaintyWords(facts).join(' '),
  };
}

function placeWords(buildings: readonly ToldBuilding[]): string {
  const [first] = buildings;
  if (first === undefined || buildings.length > 1) return 'your buildings';
  return `your ${ownerPlace(first.building.use)}`;
}

function contactWords({ contact }: LetterSettings): string {
  const { name, email, phone, hours } = contact;
  return [name, email, phone, hours].filter((part) => part !== '').join(', ');
}

function decisionWords(buildings: readonly ToldBuilding[]): string {
  const [first] = buildings;
  if (first !== undefined && buildings.length === 1) {
    return ownerDecisionWords(first.building.decision);
  }
  return buildings
    .map(({ building }) => `${where(building)}: ${ownerDecisionWords(building.decision)}`)
    .join(' ');
}

/** Until dates are known, none is promised. */
const NO_DATES = ['No days are set yet. We write to you when they are.'];

function datesOf({ milestones }: LetterSettings): readonly string[] {
  if (milestones.length === 0) return NO_DATES;
  return milestones.map(({ when, title, words }) => `${when}: ${title}. ${words}`.trim());
}

/** What every mark of a template says in a letter. */
export function valuesOfLetter({
  name,
  scheme,
  answerBy,
  settings,
  buildings,
}: About): LetterValues {
  const measures = [...new Set(buildings.flatMap(({ building }) => building.measures))];
  return {
    name,
    scheme,
    place: placeWords(buildings),
    ...foundWords(buildings),
    repairs: settings.repairs.words,
    'answer by': nearDayInWords(answerBy),
    contact: contactWords(settings),
    decision: decisionWords(buildings),
    buildings: buildings.map(({ building }) => where(building)),
    measures: measures.length > 0 ? measures : ['Nothing has to be done to protect it.'],
    dates: datesOf(settings),
    cautions: OWNER_CAUTIONS,
    link: 'Open your page',
  };
}
