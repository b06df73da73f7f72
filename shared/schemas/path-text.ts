const MOST_PARTS = 12;

/**
 * A place in a JSON document as people write it: `drives[0].axis[2]`. A very deep one is cut short.
 *
 * Units: none. Valid: any path; an empty one is the document itself. Source: [own].
 */
export function pathText(path: readonly PropertyKey[]): string {
  let text = '';
  for (const part of path.slice(0, MOST_PARTS)) {
    if (typeof part === 'number') text += `[${part}]`;
    else text += text === '' ? String(part) : `.${String(part)}`;
  }
  if (path.length > MOST_PARTS) text += '…';
  return text === '' ? 'the document' : text;
}
