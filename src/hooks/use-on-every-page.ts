import { useEffect } from 'react';

const NAME = '--on-every-page';

/** A text as CSS writes it between quotes. */
function quoted(words: string): string {
  return `"${words.replaceAll(/["\\]/g, String.raw`\$&`).replaceAll(/\s+/g, ' ')}"`;
}

/** Says something at the foot of each page of paper for as long as what it is said of is shown. */
export function useOnEveryPage(words: string): void {
  useEffect(() => {
    const { style } = document.documentElement;
    style.setProperty(NAME, quoted(words));
    return () => {
      style.removeProperty(NAME);
    };
  }, [words]);
}
