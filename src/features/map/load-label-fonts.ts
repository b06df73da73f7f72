import './label-fonts.css';

/** Letters of each subset that names are written in. */
const LETTERS = 'Aaæøłč';
const FONTS = ['400', '600', 'italic 400'];

/** Waits for the fonts of the labels: the map keeps what it has drawn with another. */
export async function loadLabelFonts(): Promise<void> {
  await Promise.all(FONTS.map((font) => document.fonts.load(`${font} 24px "Noto Sans"`, LETTERS)));
}
