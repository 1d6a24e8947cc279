import { mutate } from 'swr';

/**
 * Has everything read again that comes from these paths, whatever its query: `readAgain('/api/briefs')` reaches the
 * key `['/api/briefs', { page: 2 }]` as well as the plain key `'/api/briefs'`.
 */
export function readAgain(...paths: string[]): void {
  void mutate((key) => paths.includes(String(Array.isArray(key) ? key[0] : key)));
}
