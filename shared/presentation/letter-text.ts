/**
 * What a letter says, with marks.
 *
 * Units: none. Valid: marks of LETTER_MARKS. Source: [own].
 */
export type LetterWords = { readonly subject: string; readonly body: string };

/**
 * What a letter says with the marks put in: a paragraph, a list, or the link to the owner's page.
 *
 * Units: none. Valid: in the order of the text. Source: [own].
 */
export type LetterTextPart =
  string | { readonly list: readonly string[] } | { readonly link: string };

/**
 * What can be put into a letter: the name of each mark, and what it says. Those of LIST_MARKS stand alone
 * between empty lines.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const LETTER_MARKS = {
  name: 'The name of whom the letter goes to',
  scheme: 'The name of the scheme',
  place: '“your home”, “your building” or “your buildings”',
  movement: 'How much the ground sinks, in millimetres and beside something from everyday life',
  looks: 'What that could look like, in everyday words',
  stays: 'What stays usable',
  repairs: 'What you promise of repairs and who pays, as the settings have it',
  sure: 'How sure the forecast is',
  'answer by': 'The day by which an answer is asked for',
  contact: 'Whom to ask: name, e-mail, telephone, hours',
  decision: 'What has been decided, in plain words',
  buildings: 'A list of the addresses that the letter is about',
  measures: 'A list of what is done to protect the buildings',
  dates: 'A list of what happens when',
  cautions: 'A list of what has to be known of any forecast',
  link: 'The link to the page of the owner',
} as const;

/**
 * The name of a mark.
 *
 * Units: none. Valid: a key of LETTER_MARKS. Source: [own].
 */
export type LetterMark = keyof typeof LETTER_MARKS;

/**
 * Marks that become a list.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export const LIST_MARKS = ['buildings', 'measures', 'dates', 'cautions'] as const;

type ListMark = (typeof LIST_MARKS)[number];

/**
 * What each mark says in one letter.
 *
 * Units: none. Valid: lists for LIST_MARKS, one text for the others. Source: [own].
 */
export type LetterValues = Readonly<
  Record<Exclude<LetterMark, ListMark>, string> & Record<ListMark, readonly string[]>
>;

const MARK = /\{([^{}\n]*)\}/g;

function isMark(name: string): name is LetterMark {
  return Object.hasOwn(LETTER_MARKS, name);
}

function isListMark(name: LetterMark): name is ListMark {
  return LIST_MARKS.some((one) => one === name);
}

function paragraphsOf(text: string): string[] {
  return text
    .split(/\n[ \t]*\n/)
    .map((paragraph) => paragraph.trim())
    .filter((paragraph) => paragraph !== '');
}

/**
 * What is wrong with the marks of a text, each fault with its line; none where all are known and stand where
 * they may.
 *
 * Units: lines from 1. Valid: any text. Source: [own].
 */
export function faultsOfMarks(text: string): readonly string[] {
  return text.split('\n').flatMap((line, k) => {
    const where = `Line ${k + 1}`;
    const marks = [...line.matchAll(MARK)].map(([, name = '']) => name);
    const known = marks.filter(isMark);
    const alone = known.filter((name) => isListMark(name) || name === 'link');
    return [
      ...marks
        .filter((name) => !isMark(name))
        .map((name) => `${where}: there is no mark {${name}}.`),
      ...alone
        .filter((name) => line.trim() !== `{${name}}`)
        .map((name) => `${where}: {${name}} stands alone in its line.`),
      ...(/[{}]/.test(line.replaceAll(MARK, '')) ? [`${where}: a brace is not closed.`] : []),
    ];
  });
}

function textOf(text: string, values: LetterValues): string {
  return text.replaceAll(MARK, (whole, name: string) => {
    if (!isMark(name)) return whole;
    return isListMark(name) ? values[name].join(', ') : values[name];
  });
}

function partsOfLink(words: string): { readonly link: string }[] {
  return words === '' ? [] : [{ link: words }];
}

function partOf(paragraph: string, values: LetterValues): LetterTextPart[] {
  const [, alone = ''] = /^\{([^{}]*)\}$/.exec(paragraph) ?? [];
  if (isMark(alone)) {
    if (isListMark(alone)) return values[alone].length === 0 ? [] : [{ list: values[alone] }];
    if (alone === 'link') return partsOfLink(values[alone]);
  }
  const lines = paragraph.split('\n').map((line) => line.trim());
  if (lines.every((line) => line.startsWith('- '))) {
    return [{ list: lines.map((line) => textOf(line.slice(2), values)) }];
  }
  const text = textOf(lines.join(' '), values).trim();
  return text === '' ? [] : [text];
}

/**
 * A letter with its marks put in, in one go: what a value holds is never taken for a mark. Empty lines part
 * paragraphs, lines that begin with "- " are a list.
 *
 * Units: none. Valid: a text without faultsOfMarks; an empty list or text leaves nothing. Source: [own].
 */
export function letterText(body: string, values: LetterValues): readonly LetterTextPart[] {
  return paragraphsOf(body).flatMap((paragraph) => partOf(paragraph, values));
}

/**
 * The subject of a letter with its marks put in, in one line.
 *
 * Units: none. Valid: a text without faultsOfMarks. Source: [own].
 */
export function letterSubject(subject: string, values: LetterValues): string {
  return textOf(subject, values);
}
