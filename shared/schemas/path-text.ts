/**
 * A place in a JSON document as people write it: `drives[0].axis[2]`.
 *
 * Units: none. Valid: any path; an empty one is the document itself. Source: [own].
 */
export function pathText(path: readonly PropertyKey[]): string {
  let text = '';
  for (const part of path) {
    if (typeof part === 'number') text += `[${part}]`;
    else text += text === '' ? String(part) : `.${String(part)}`;
  }
  return text === '' ? 'the document' : text;
}
