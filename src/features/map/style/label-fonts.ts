/** Fonts of the page's style sheets, by names that tell the map their weight and slope. */
export const LABEL_FONTS = {
  regular: ['Noto Sans'],
  italic: ['Noto Sans Italic', 'Noto Sans'],
  semibold: ['Noto Sans Semibold', 'Noto Sans'],
};
