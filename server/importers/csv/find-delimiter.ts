const DELIMITERS = [',', ';', '\t', '|'];
const SAMPLE = 64 * 1024;
/** A first line that spreadsheets write for themselves. */
const HINT = /^sep=([,;\t|])\r?\n/i;

export type Dialect = {
  readonly delimiter: string;
  /** Where the heading begins. */
  readonly start: number;
};

/** The first line that ends outside of quotation marks, without what stands inside of them. */
function headingWithoutQuotes(sample: string): string {
  const bare = sample.trimStart().replaceAll(/"(?:[^"]|"")*"/g, '');
  return bare.split(/[\r\n]/, 1)[0] ?? '';
}

/** Finds what separates the values: what stands most often in the heading. */
export function findDelimiter(text: Buffer): Dialect {
  const sample = text.toString('utf8', 0, SAMPLE);
  const hint = HINT.exec(sample);
  if (hint !== null) return { delimiter: hint[1] ?? ',', start: hint[0].length };
  const heading = headingWithoutQuotes(sample);
  const counts = DELIMITERS.map((one) => heading.split(one).length - 1);
  const most = Math.max(...counts);
  // one column without a delimiter: its text may have commas
  return { delimiter: (most === 0 ? '\t' : DELIMITERS[counts.indexOf(most)]) ?? ',', start: 0 };
}
