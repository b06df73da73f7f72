import type { Weight } from './font-files.ts';
import { INKS } from './inks.ts';
import type { Paper } from './paper.ts';

/** A piece of text in one look; what rises is set smaller, above or below the line. */
export type Piece = {
  readonly text: string;
  readonly weight?: Weight;
  readonly ink?: string;
  readonly rise?: 'over' | 'under';
};

export type Words = string | readonly Piece[];

/** How words look unless a piece says otherwise; size in points of the space drawn in. */
export type Look = { readonly size: number; readonly weight?: Weight; readonly ink?: string };

type Glyphs = {
  readonly font: string;
  readonly text: string;
  readonly size: number;
  readonly ink: string;
  readonly rise: Piece['rise'];
  readonly width: number;
};

/** Words as they stand in one line. */
export type Line = { readonly glyphs: readonly Glyphs[]; readonly width: number };

const SMALL = 0.72;
const RISE = { over: 0.34, under: -0.16 } as const;
const POWERS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

function plainPower(text: string): string {
  return text.replaceAll(/./gu, (one) => (one === '⁻' ? '−' : String(POWERS.indexOf(one))));
}

/** Powers of ten are set above the line: fonts lack most of the small figures. */
function withPowers(piece: Piece): readonly Piece[] {
  return piece.text
    .split(/(?<=\d)((?![²³](?![⁰¹²³⁴-⁹]))[⁰¹²³⁴-⁹⁻]+)/)
    .map((text, k): Piece =>
      k % 2 === 0 ? { ...piece, text } : { ...piece, text: plainPower(text), rise: 'over' },
    )
    .filter(({ text }) => text !== '');
}

/** The pieces of words. */
export function piecesOf(words: Words): readonly Piece[] {
  return (typeof words === 'string' ? [{ text: words }] : words).flatMap(withPowers);
}

function glyphsOf({ doc, faces }: Paper, piece: Piece, look: Look): readonly Glyphs[] {
  const size = piece.rise === undefined ? look.size : look.size * SMALL;
  const ink = piece.ink ?? look.ink ?? INKS.ink;
  const weight = piece.weight ?? look.weight ?? 'regular';
  return faces.runsOf(piece.text, weight).map(({ font, text }) => {
    const width = doc.font(font).fontSize(size).widthOfString(text);
    return { font, text, size, ink, rise: piece.rise, width };
  });
}

/** Words in one line, however long. */
export function lineOf(paper: Paper, words: Words, look: Look): Line {
  const glyphs = piecesOf(words).flatMap((piece) => glyphsOf(paper, piece, look));
  return { glyphs, width: glyphs.reduce((sum, { width }) => sum + width, 0) };
}

/** Writes a line from its left end; `y` is where its letters stand. */
export function writeLine({ doc }: Paper, { glyphs }: Line, x: number, y: number): void {
  let at = x;
  for (const { font, text, size, ink, rise, width } of glyphs) {
    const lift = rise === undefined ? 0 : (RISE[rise] * size) / SMALL;
    doc.font(font).fontSize(size).fillColor(ink);
    doc.text(text, at, y - lift, { lineBreak: false, baseline: 'alphabetic' });
    at += width;
  }
}
