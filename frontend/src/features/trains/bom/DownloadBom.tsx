import Button from '@mui/material/Button';
import { useState, type MouseEvent } from 'react';
import { bomWorkbookUrl, fetchWorkbook } from '../../../api/hooks/useTrainBom';
import { asProblem } from '../../../api/problem';

interface DownloadBomProps {
  code: string;
  variant: 'contained' | 'outlined';
  /** Told in place; null when a new try begins. */
  onProblem: (message: string | null) => void;
}

/**
 * The workbook as a plain link, so that it can be opened elsewhere, copied and saved under a name. A plain click
 * fetches it first: what the server refuses is then told on this page instead of standing in a page of its own.
 */
export function DownloadBom({ code, variant, onProblem }: DownloadBomProps) {
  const [busy, setBusy] = useState(false);

  async function download(event: MouseEvent): Promise<void> {
    if (event.metaKey || event.ctrlKey || event.shiftKey || event.altKey) return;
    event.preventDefault();
    if (busy) return;
    setBusy(true);
    onProblem(null);
    try {
      const { file, name } = await fetchWorkbook(code);
      saveFile(file, name);
    } catch (error) {
      onProblem(asProblem(error).message);
    } finally {
      setBusy(false);
    }
  }

  return (
    <Button
      variant={variant}
      component="a"
      href={bomWorkbookUrl(code)}
      download
      aria-busy={busy}
      onClick={(event: MouseEvent) => void download(event)}
    >
      Download BOM (.xlsx)
    </Button>
  );
}

function saveFile(file: Blob, name: string): void {
  const address = URL.createObjectURL(file);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // The browser has taken hold of the file by the next turn; keeping the address would keep the file in memory.
  setTimeout(() => URL.revokeObjectURL(address), 0);
}
