import { fontsOf, type Weight } from './font-files.ts';

/** A stretch of text that one font can write. */
export type FaceRun = { readonly font: string; readonly text: string };

/** Chooses fonts by what each can write. */
export type Faces = { readonly runsOf: (text: string, weight: Weight) => readonly FaceRun[] };

/** What a document is asked of fonts. */
type FontKeeper = Pick<PDFKit.PDFDocument, 'registerFont' | 'font'>;

type Written = { readonly font: string; readonly text: string };

/** Signs without a glyph in any font that is carried along, as they are written without one. */
const WRITTEN_OUT: Readonly<Record<string, string>> = { '\u2062': '', '\u00ad': '', '\t': ' ' };

function hasGlyphs(font: unknown): font is { hasGlyphForCodePoint: (code: number) => boolean } {
  return (
    typeof font === 'object' &&
    font !== null &&
    typeof Reflect.get(font, 'hasGlyphForCodePoint') === 'function'
  );
}

function isObject(value: unknown): value is object {
  return typeof value === 'object' && value !== null;
}

/** Whether the font that a document writes in has a glyph; the document itself does not tell. */
function canWrite(document: FontKeeper, character: string): boolean {
  const current: unknown = Reflect.get(document, '_font');
  const font: unknown = isObject(current) ? Reflect.get(current, 'font') : undefined;
  if (!hasGlyphs(font))
    throw new Error('The fonts of a document cannot be asked for their glyphs.');
  return font.hasGlyphForCodePoint(character.codePointAt(0) ?? 0);
}

function codeOf(character: string): string {
  return `[U+${(character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}]`;
}

/** The fonts of a document. What none of them can write is written out, so that nothing is lost unseen. */
export function openFaces(document: FontKeeper): Faces {
  const known: Record<Weight, Map<string, Written>> = { regular: new Map(), strong: new Map() };
  const fonts = { regular: fontsOf('regular'), strong: fontsOf('strong') };
  const registered = new Set<string>();

  /** Only what is asked for is read and unpacked. */
  function register({ name, font }: (typeof fonts)['regular'][number]): string {
    if (!registered.has(name)) document.registerFont(name, font());
    registered.add(name);
    return name;
  }

  function find(character: string, weight: Weight): Written {
    for (const one of fonts[weight]) {
      const font = register(one);
      if (canWrite(document.font(font), character)) return { font, text: character };
    }
    const font = fonts[weight][0]?.name ?? '';
    return { font, text: WRITTEN_OUT[character] ?? codeOf(character) };
  }

  function written(character: string, weight: Weight): Written {
    const found = known[weight].get(character) ?? find(character, weight);
    known[weight].set(character, found);
    return found;
  }

  return {
    runsOf: (text, weight) => {
      const runs: { font: string; text: string }[] = [];
      for (const character of text.normalize('NFC').replaceAll(/[\r\n]+/g, ' ')) {
        const one = written(character, weight);
        const last = runs.at(-1);
        if (last?.font === one.font) last.text += one.text;
        else if (one.text !== '') runs.push({ ...one });
      }
      return runs;
    },
  };
}
