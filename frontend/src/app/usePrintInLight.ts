import { useEffect } from 'react';

/** Paper is white: while the page is being printed the light palette stands in for the dark one. */
export function usePrintInLight(): void {
  useEffect(() => {
    const root = document.documentElement;
    let shown: string | null = null;
    const before = () => {
      shown ??= root.getAttribute('data-scheme');
      root.setAttribute('data-scheme', 'light');
    };
    const after = () => {
      if (shown !== null) root.setAttribute('data-scheme', shown);
      shown = null;
    };
    addEventListener('beforeprint', before);
    addEventListener('afterprint', after);
    return () => {
      removeEventListener('beforeprint', before);
      removeEventListener('afterprint', after);
    };
  }, []);
}
