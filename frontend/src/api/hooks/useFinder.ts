import { useEffect, useState } from 'react';
import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { FinderResult } from '../types';

const PAUSE_MS = 180;

/** Parts, briefs and trains that carry the text; asks after a short pause in typing. */
export function useFinder(text: string) {
  const [settled, setSettled] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setSettled(text.trim().slice(0, 200)), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [text]);
  const { data, error, isLoading } = useSWR<FinderResult, unknown>(
    settled === '' ? null : ['/api/finder', settled],
    ([, wanted]: [string, string]) => answer(api.GET('/api/finder', { params: { query: { text: wanted } } })),
    { keepPreviousData: true, revalidateOnFocus: false },
  );
  return {
    found: text.trim() === '' ? undefined : data,
    isLoading: isLoading || (text.trim() !== '' && text.trim() !== settled),
    problem: error === undefined ? null : asProblem(error),
  };
}
