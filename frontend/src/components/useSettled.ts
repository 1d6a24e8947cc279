import { useEffect, useState } from 'react';

/** The text once typing has rested, so that a list is not asked for every letter. */
export function useSettled(text: string, restMs = 180): string {
  const [settled, setSettled] = useState(text);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(text), restMs);
    return () => clearTimeout(timer);
  }, [text, restMs]);
  return settled;
}
