import { useEffect, useState } from 'react';

/** A value as it was once it had stood still for a while, so that not every letter asks the server. */
export function useDelayedValue<T>(value: T, milliseconds: number): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => {
      setSettled(value);
    }, milliseconds);
    return () => {
      clearTimeout(timer);
    };
  }, [value, milliseconds]);
  return settled;
}
