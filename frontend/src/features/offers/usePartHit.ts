import { useFinder } from '../../api/hooks/useFinder';
import type { FinderResult } from '../../api/types';

type Hit = FinderResult['parts'][number];

/** Parts that carry the text, and the one whose number it is, whatever the case of its letters. */
export function usePartHit(text: string): { hits: Hit[]; hit: Hit | undefined; isLoading: boolean } {
  const { found, isLoading } = useFinder(text);
  const hits = found?.parts ?? [];
  const wanted = text.trim().toLowerCase();
  return { hits, hit: hits.find(({ number }) => number.toLowerCase() === wanted), isLoading };
}
