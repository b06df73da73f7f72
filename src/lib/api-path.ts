/** A path of the API with every value made safe to stand in it. */
export function apiPath(
  words: TemplateStringsArray,
  ...values: readonly (string | number)[]
): string {
  return words.reduce((path, word, index) => {
    const value = values[index - 1];
    return path + (value === undefined ? '' : encodeURIComponent(value)) + word;
  });
}
