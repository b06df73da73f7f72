import { useEffect, useState } from 'react';
import { flushSync } from 'react-dom';

/** Whether the page is being printed. What then changes is in the page before the browser lays it out. */
export function usePrinting(): boolean {
  const [isPrinting, setPrinting] = useState(false);
  useEffect(() => {
    const begin = () => {
      flushSync(() => {
        setPrinting(true);
      });
    };
    const end = () => {
      setPrinting(false);
    };
    window.addEventListener('beforeprint', begin);
    window.addEventListener('afterprint', end);
    return () => {
      window.removeEventListener('beforeprint', begin);
      window.removeEventListener('afterprint', end);
    };
  }, []);
  return isPrinting;
}
