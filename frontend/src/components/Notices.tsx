import Button from '@mui/material/Button';
import Snackbar from '@mui/material/Snackbar';
import { createContext, useCallback, useContext, useMemo, useState, type ReactNode } from 'react';

interface Notice {
  message: string;
  action?: { name: string; run: () => void };
}

interface NoticeDesk {
  /** Shows one line at the foot of the page; with an action (such as Undo) it stays long enough to use it. */
  tell: (message: string, action?: Notice['action']) => void;
}

const Desk = createContext<NoticeDesk>({ tell: () => undefined });

export function NoticeProvider({ children }: { children: ReactNode }) {
  const [queue, setQueue] = useState<(Notice & { id: number })[]>([]);
  const tell = useCallback<NoticeDesk['tell']>((message, action) => {
    setQueue((waiting) => [...waiting.slice(-2), { message, action, id: Date.now() + Math.random() }]);
  }, []);
  const close = useCallback(() => setQueue((waiting) => waiting.slice(1)), []);
  const desk = useMemo(() => ({ tell }), [tell]);
  const first = queue[0];
  return (
    <Desk.Provider value={desk}>
      {children}
      <Snackbar
        key={first?.id}
        open={first !== undefined}
        autoHideDuration={first?.action ? 10_000 : 5_000}
        onClose={(_, reason) => {
          if (reason !== 'clickaway') close();
        }}
        message={first?.message}
        action={
          first?.action && (
            <Button
              color="inherit"
              onClick={() => {
                first.action?.run();
                close();
              }}
            >
              {first.action.name}
            </Button>
          )
        }
      />
    </Desk.Provider>
  );
}

export function useNotices(): NoticeDesk {
  return useContext(Desk);
}
