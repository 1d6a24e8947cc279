import { useSWRConfig } from 'swr';

/** Asks anew for every list, count and facet that a change of parts may touch. */
export function useRefreshParts(): () => void {
  const { mutate } = useSWRConfig();
  return () => {
    void mutate((key) => {
      const path: unknown = Array.isArray(key) ? key[0] : key;
      return typeof path === 'string' && (path.startsWith('/api/parts') || path === '/api/overview');
    });
  };
}
