/** A moment to the minute, the same for everybody. */
export function momentWords(moment: Date): string {
  return `${moment.toISOString().slice(0, 16).replace('T', ' ')} UTC`;
}
