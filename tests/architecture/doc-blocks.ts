import type { Export } from './exports.ts';

/** What a source may be called besides by the key of a cited work. */
const MARKS = ['own', 'common'];
/** How something that gathers others leaves the source to them. */
const LEFT_TO_PARTS =
  /\b(the parts cite theirs|see the parts|each( line| rule)? (names|cites) its own)\b/;
/** The shape of the key of a cited work. */
const KEY = /[a-z]+(?:-[a-z]+)*-\d{4}/g;

/** What a doc block may refer to. */
export type Known = { readonly references: readonly string[]; readonly names: readonly string[] };

function sourceFaults(source: string, { references, names }: Known): string[] {
  const keys = [...source.matchAll(KEY)].map(([key]) => key);
  const marks = [...source.matchAll(/\[([^\]]*)\]/g)].map(([, mark]) => mark ?? '');
  const elsewhere = [...source.matchAll(/\b(?:as|see) `?(\w+)`?/g)].map(([, name]) => name ?? '');
  const strange = [
    ...keys.filter((key) => !references.includes(key)),
    ...marks.filter((mark) => !MARKS.includes(mark)).map((mark) => `[${mark}]`),
  ];
  if (strange.length > 0) return [`cites ${strange.join(', ')}, which is no reference`];
  const cites =
    keys.length > 0 ||
    marks.length > 0 ||
    elsewhere.some((name) => names.includes(name)) ||
    LEFT_TO_PARTS.test(source);
  return cites ? [] : [`has a source that is neither a reference, [own] nor [common]: ${source}`];
}

function blockFaults(words: string, known: Known): string[] {
  const parts = words.split(/\b(Units|Valid|Source): /);
  if (parts.filter((_, index) => index % 2 === 1).join() !== 'Units,Valid,Source') {
    return ['lacks one of Units:, Valid:, Source:, or has them out of order or twice'];
  }
  const [meaning = '', , units = '', , valid = '', , source = ''] = parts.map((part) =>
    part.trim(),
  );
  const told = Object.entries({ meaning, units, valid, source })
    .filter(([, part]) => !/\S\.\)?$/.test(part))
    .map(([name]) => `has no sentence for its ${name}`);
  return [...told, ...sourceFaults(source, known)];
}

/** Exports without a block that gives their meaning, units, validity and source. */
export function docFaults(exports: readonly Export[], known: Known): string[] {
  return exports.flatMap(({ names, place, words }) => {
    const faults = words === undefined ? ['has no doc block'] : blockFaults(words, known);
    return faults.map((fault) => `${place} ${names.join(', ')} ${fault}`);
  });
}
