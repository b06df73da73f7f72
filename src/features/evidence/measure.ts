import type { Measure } from '../../../shared/evidence/marks.ts';

const MM_PER_POINT = 25.4 / 72;
/** Words are measured large, so that rounding of small ones does not add up. */
const LARGE = 100;

/** The weights that sheets are written in, as the browser loads them. */
export function sheetFonts(): Promise<unknown> {
  const weights = [400, 600].map((weight) => `${weight} ${LARGE}px "Noto Sans"`);
  return Promise.all(weights.map((font) => document.fonts.load(font)));
}

/** How wide words are in the browser, in the fonts that sheets are written in, which have been loaded. */
export function screenMeasure(): Measure {
  const context = document.createElement('canvas').getContext('2d');
  const known = new Map<string, number>();
  return (words, size, isStrong) => {
    const key = `${isStrong ? 'b' : 'r'}${words}`;
    let wide = known.get(key);
    if (wide === undefined) {
      // where nothing can be measured, half a square for each letter
      wide = words.length * 0.55;
      if (context !== null) {
        context.font = `${isStrong ? 600 : 400} ${LARGE}px "Noto Sans"`;
        wide = context.measureText(words).width / LARGE;
      }
      known.set(key, wide);
    }
    return wide * size * MM_PER_POINT;
  };
}
