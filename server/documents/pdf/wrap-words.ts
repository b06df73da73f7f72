import type { Paper } from './paper.ts';
import { lineOf, piecesOf, type Line, type Look, type Piece, type Words } from './words.ts';

function widthOf(paper: Paper, pieces: readonly Piece[], look: Look): number {
  return lineOf(paper, pieces, look).width;
}

/** What may stand alone in a line: pieces of letters between spaces. */
type Chunk = { readonly pieces: Piece[]; readonly isSpace: boolean; readonly isBreak?: boolean };

function chunksOf(words: Words): Chunk[] {
  const chunks: Chunk[] = [];
  for (const piece of piecesOf(words)) {
    for (const text of piece.text.split(/( +|\n)/).filter((one) => one !== '')) {
      if (text === '\n') {
        chunks.push({ pieces: [], isSpace: true, isBreak: true });
        continue;
      }
      const isSpace = text.startsWith(' ');
      const last = chunks.at(-1);
      // letters in two looks without a space between stay together
      if (last !== undefined && !isSpace && !last.isSpace) last.pieces.push({ ...piece, text });
      else chunks.push({ pieces: [{ ...piece, text }], isSpace });
    }
  }
  return chunks;
}

/** A word that is wider than the line is cut where the line ends. */
function cut(paper: Paper, { pieces, isSpace }: Chunk, look: Look, width: number): Chunk[] {
  if (isSpace || widthOf(paper, pieces, look) <= width) return [{ pieces, isSpace }];
  const parts: Chunk[] = [];
  let row: Piece[] = [];
  for (const piece of pieces) {
    for (const text of piece.text) {
      const longer = [...row, { ...piece, text }];
      if (row.length > 0 && widthOf(paper, longer, look) > width) {
        parts.push({ pieces: row, isSpace });
        row = [{ ...piece, text }];
      } else row = longer;
    }
  }
  return [...parts, { pieces: row, isSpace }];
}

function isAlike(a: Piece, b: Piece): boolean {
  return a.weight === b.weight && a.ink === b.ink && a.rise === b.rise;
}

/** Letters of one look that follow each other are written at once, so that they can be found as a whole. */
function joined(pieces: readonly Piece[]): Piece[] {
  const all: Piece[] = [];
  for (const piece of pieces) {
    const last = all.at(-1);
    if (last !== undefined && isAlike(last, piece))
      all[all.length - 1] = { ...last, text: last.text + piece.text };
    else all.push(piece);
  }
  return all;
}

/** Words in lines that are no wider than a width; never without a line. */
export function wrapWords(paper: Paper, words: Words, look: Look, width: number): readonly Line[] {
  const rows: Piece[][] = [[]];
  let [used, space]: [number, Piece[]] = [0, []];
  for (const whole of chunksOf(words)) {
    if (whole.isBreak === true) {
      rows.push([]);
      [used, space] = [0, []];
      continue;
    }
    for (const { pieces, isSpace } of cut(paper, whole, look, width)) {
      if (isSpace) {
        space = pieces;
        continue;
      }
      const own = widthOf(paper, pieces, look);
      const gap = used === 0 ? 0 : widthOf(paper, space, look);
      if (used > 0 && used + gap + own > width) {
        rows.push([...pieces]);
        used = own;
      } else {
        rows.at(-1)?.push(...(used === 0 ? [] : space), ...pieces);
        used += gap + own;
      }
      space = [];
    }
  }
  return rows.map((pieces) => lineOf(paper, joined(pieces), look));
}
