/** A value once it has not changed for a while: text that is not read out letter by letter, paper that is not drawn anew. */
import { useEffect, useState } from 'react';

export function useRested<Value>(value: Value, pause: number): Value | undefined {
  const [rested, setRested] = useState<Value>();
  useEffect(() => {
    const timer = setTimeout(() => setRested(() => value), pause);
    return () => clearTimeout(timer);
  }, [value, pause]);
  return rested;
}
