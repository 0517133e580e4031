/** A text once it has not changed for a while, so that typing is not read out letter by letter. */
import { useEffect, useState } from 'react';

export function useRested(text: string, pause: number): string {
  const [rested, setRested] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setRested(text), pause);
    return () => clearTimeout(timer);
  }, [text, pause]);
  return rested;
}
