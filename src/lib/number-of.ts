const NUMBER = /^-?(\d+([.,]\d*)?|[.,]\d+)$/;

/** The number that somebody wrote, with a point or a comma and any minus; null where it is none. */
export function numberOf(text: string): number | null {
  const plain = text.replaceAll(/\s/g, '').replace('\u2212', '-');
  return NUMBER.test(plain) ? Number(plain.replace(',', '.')) : null;
}
