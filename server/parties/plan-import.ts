import { randomUUID } from 'node:crypto';
import { setImmediate } from 'node:timers/promises';
import type {
  PartyColumns,
  PartyImportCounts,
  PartyImportRow,
} from '../../shared/schemas/party-imports.ts';
import { PARTY_LIMITS, type InterestValues } from '../../shared/schemas/parties.ts';
import type { NewInterest, NewParty } from '../models/write-parties.ts';
import { buildingFinder, type KnownBuilding } from './find-building-of-row.ts';
import { partyIndex, type KnownParty, type ListedBefore } from './known-party.ts';
import { rowReader, type ReadRow, type StagedTable } from './read-party-row.ts';
import { sameWords } from './same-words.ts';

export type KnownBefore = {
  readonly buildings: readonly KnownBuilding[];
  readonly parties: readonly ListedBefore[];
};

/** What an import would write, and what it says about each row. */
export type PartyPlan = {
  readonly lines: readonly PartyImportRow[];
  readonly counts: PartyImportCounts;
  readonly added: readonly NewParty[];
  readonly interests: readonly NewInterest[];
  /** Parties there already that get something that they lacked. */
  readonly completed: readonly Pick<KnownParty, 'id' | 'email' | 'representedBy'>[];
};

type Line = Pick<PartyImportRow, 'outcome' | 'remarks'>;

/** Says who represents a party, where that can be told and nobody does yet; what stands in the way. */
function representedSo(
  party: KnownParty,
  called: readonly KnownParty[],
  represents: Set<string | null>,
): string[] {
  const [who, ...others] = called;
  if (who === undefined || others.length > 0 || who === party) {
    return ['Who represents them could not be told: one other party has to go by that name.'];
  }
  if (party.representedBy === who.id) return [];
  if (party.representedBy !== null) {
    return ['Somebody else represents them already, which stays.'];
  }
  if (who.representedBy !== null || represents.has(party.id)) {
    return ['Who represents others is represented by nobody, so this was left out.'];
  }
  party.representedBy = who.id;
  represents.add(who.id);
  return [];
}

/** The parties of a table, one after the other as its rows name them. */
function planner(known: KnownBefore) {
  const index = partyIndex(known.parties);
  const fresh = new Map<KnownParty, ReadRow['party']>();
  const interests: NewInterest[] = [];
  const completed = new Set<KnownParty>();
  const represents = new Set(known.parties.map((one) => one.representedBy));

  /** The party of a row, with what it lacked so far; what differs is said and stays as it was. */
  function partyOf({ party }: ReadRow, remarks: string[]): KnownParty {
    const { name, email } = party;
    const address = party.address.join('\n');
    const found = index.find({ name, address, email });
    if (found === undefined) {
      const id = randomUUID();
      const added = { id, isNew: true, name, address, email, representedBy: null, interests: [] };
      fresh.set(added, party);
      index.add(added);
      return added;
    }
    if (sameWords(found.address) !== sameWords(address)) {
      remarks.push('The postal address differs from the one that is there, which stays.');
    }
    if (email !== null && found.email === null) {
      found.email = email;
      completed.add(found);
    } else if (email !== null && found.email?.toLowerCase() !== email.toLowerCase()) {
      remarks.push('The e-mail address differs from the one that is there, which stays.');
    }
    return found;
  }
  function hold(party: KnownParty, interest: InterestValues): Line {
    const { buildingId, kind, from, to } = interest;
    const alike = party.interests.filter(
      (one) => one.buildingId === buildingId && one.kind === kind,
    );
    const isSame = alike.some((one) => one.from === from && one.to === to);
    if (isSame || (alike.length > 0 && from === null && to === null)) {
      return { outcome: 'there already', remarks: [] };
    }
    if (alike.some((one) => one.from === null && one.to === null)) {
      const remark = 'The interest is there without days and stays so. Add the days by hand.';
      return { outcome: 'there already', remarks: [remark] };
    }
    const isFirst = party.isNew && party.interests.length === 0;
    party.interests.push(interest);
    interests.push({ id: randomUUID(), partyId: party.id, ...interest });
    if (!party.isNew) completed.add(party);
    return { outcome: isFirst ? 'new party' : 'new interest', remarks: [] };
  }
  function represent(party: KnownParty, words: string): string[] {
    const before = party.representedBy;
    const remarks = representedSo(party, index.called(words), represents);
    if (party.representedBy !== before && !party.isNew) completed.add(party);
    return remarks;
  }
  return { partyOf, hold, represent, fresh, interests, completed };
}

/** Others are served between so many rows. */
const AT_ONCE = 1000;

type Judged = {
  readonly read: ReadRow;
  readonly line: PartyImportRow;
  readonly party?: KnownParty;
};

function judge(
  read: ReadRow,
  find: ReturnType<typeof buildingFinder>,
  plan: ReturnType<typeof planner>,
): Judged {
  const { row, reference: said, party: named, interest } = read;
  const found = find(said, read.buildingAddress);
  const problems = [...read.problems, ...(found.building === null ? [found.problem] : [])];
  const at = { row, reference: found.building?.reference ?? said, name: named.name };
  if (found.building === null || problems.length > 0) {
    return { read, line: { ...at, outcome: 'problem', remarks: problems } };
  }
  const remarks: string[] = [];
  const party = plan.partyOf(read, remarks);
  if (party.interests.length >= PARTY_LIMITS.interests) {
    const message = `One party holds ${PARTY_LIMITS.interests} interests at most.`;
    return { read, line: { ...at, outcome: 'problem', remarks: [message] } };
  }
  const line = plan.hold(party, { buildingId: found.building.id, ...interest });
  const all = [...remarks, ...line.remarks];
  return { read, party, line: { ...at, outcome: line.outcome, remarks: all } };
}

function countsOf(
  lines: readonly PartyImportRow[],
  plan: ReturnType<typeof planner>,
): PartyImportCounts {
  const count = (outcome: PartyImportRow['outcome']) =>
    lines.filter((line) => line.outcome === outcome).length;
  return {
    rows: lines.length,
    'new party': count('new party'),
    'new interest': count('new interest'),
    'there already': count('there already'),
    problem: count('problem'),
    noted: lines.filter(({ outcome, remarks }) => outcome !== 'problem' && remarks.length > 0)
      .length,
    partiesAdded: plan.fresh.size,
    partiesCompleted: [...plan.completed].filter(({ isNew }) => !isNew).length,
  };
}

/** What a table comes to with the register and the parties of now. Nothing is written here. */
export async function planImport(
  table: StagedTable,
  columns: PartyColumns,
  known: KnownBefore,
): Promise<PartyPlan> {
  const [read, find] = [rowReader(table, columns), buildingFinder(known.buildings)];
  const plan = planner(known);
  const judged: Judged[] = [];
  for (const [index, staged] of table.rows.entries()) {
    if (index % AT_ONCE === 0) await setImmediate();
    const row = read(staged);
    // lines of the form that nobody filled in are passed over
    if (row.isFilled) judged.push(judge(row, find, plan));
  }
  // whoever represents others may stand further down
  const lines = judged.map(({ read: { representedBy }, line, party }) => {
    if (party === undefined || representedBy === '') return line;
    return { ...line, remarks: [...line.remarks, ...plan.represent(party, representedBy)] };
  });
  const added = [...plan.fresh].map(([{ id, email, representedBy }, party]) => {
    return { ...party, id, email, representedBy };
  });
  return {
    lines,
    counts: countsOf(lines, plan),
    // whoever represents others is represented by nobody, and has to be there first
    added: added.sort(
      (a, b) => Number(a.representedBy !== null) - Number(b.representedBy !== null),
    ),
    interests: plan.interests,
    completed: [...plan.completed].filter(({ isNew }) => !isNew),
  };
}
