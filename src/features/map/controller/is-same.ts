/** Whether two pieces of a style, which are plain JSON, say the same. */
export function isSame(a: unknown, b: unknown): boolean {
  return a === b || JSON.stringify(a) === JSON.stringify(b);
}
