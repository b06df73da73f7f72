import type { BatchDetail, BatchPreview } from '../../../shared/schemas/letter-batches.ts';

type Exceptions = BatchDetail['chosen'];

function standing(exceptions: Exceptions): BatchPreview['chosen'] {
  const byParty = new Map(exceptions.map(({ partyId, why }) => [partyId, why]));
  return [...byParty].flatMap(([partyId, why]) => (partyId === null ? [] : [{ partyId, why }]));
}

/** What is asked for where a batch is prepared again: its kind, and who was chosen or left out by hand. */
export function preparedAgain(earlier: BatchDetail | null): BatchPreview {
  if (earlier === null) return { kind: 'first information', leftOut: [], chosen: [] };
  const { batch, leftOut, chosen } = earlier;
  return { kind: batch.kind, leftOut: standing(leftOut), chosen: standing(chosen) };
}

function people(count: number, one: string, many: string): string[] {
  if (count === 0) return [];
  return [count === 1 ? `1 ${one}` : `${count.toLocaleString('en-GB')} ${many}`];
}

/** What a batch that is prepared again has from the earlier one, and who is not in it any more. */
export function preparedAgainWords(earlier: BatchDetail): string {
  const { batch, text } = earlier;
  const { chosen, leftOut } = preparedAgain(earlier);
  const taken = [
    ...(text === null ? [] : ['its text']),
    ...people(chosen.length, 'party chosen by hand', 'parties chosen by hand'),
    ...people(leftOut.length, 'party left out', 'parties left out'),
  ];
  const gone = earlier.chosen.filter(({ partyId }) => partyId === null).length;
  return [
    `Batch ${batch.number} is prepared again`,
    taken.length === 0 ? '.' : `, with ${taken.join(' and ')}.`,
    gone === 0 ? '' : ` ${gone} who had been chosen by hand cannot get a letter any more.`,
    batch.comment === null ? '' : ` Its check said: “${batch.comment}”`,
  ].join('');
}
