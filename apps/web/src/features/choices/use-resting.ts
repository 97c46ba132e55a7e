import { useEffect, useState } from 'react';

const REST_MS = 150;

/** A value that changes with every frame, once it has come to rest; what is worked out from it does not hold up the hand. */
export function useResting<T>(value: T): T {
  const [rested, setRested] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setRested(value), REST_MS);
    return () => clearTimeout(timer);
  }, [value]);
  return rested;
}
