import { useState } from 'react';
import { asProblem } from '../../api/problem';
import type { PastePreview } from './pasteTypes';
import { wrongRowsOf } from './wrongRows';

export interface PasteCalls {
  /** @throws Problem when refused */
  preview: (text: string) => Promise<PastePreview>;
  /** Books, and gives a sentence that says what was booked. @throws Problem when refused */
  book: (text: string, token: string, leaveOutWrong: boolean) => Promise<string>;
}

export interface PasteState {
  text: string;
  setText: (text: string) => void;
  /** What booking the text as it stands would do; null until it was checked. */
  preview: PastePreview | null;
  /** Changes with every preview, so that a table of rows starts anew. */
  previewKey: number;
  busy: 'preview' | 'book' | null;
  /** What the server refused, or what it has to say before something is booked. */
  remark: { severity: 'error' | 'warning' | 'success'; message: string } | null;
  check: (text?: string) => Promise<void>;
  /** Books; `leftOut` rows stay in the text. Null when something stood in the way. */
  book: (leaveOutWrong: boolean) => Promise<{ said: string; leftOut: boolean } | null>;
}

const OUTDATED =
  'What stands in the library changed since you saw the rows. Nothing is booked yet; below is what would happen now.';

/**
 * Checking and booking pasted rows. The text stays whatever the server says; what was checked counts only for the text
 * and the settings it was checked with.
 * @param settings changes with whatever else decides what the rows mean, such as the supplier
 */
export function usePaste(calls: PasteCalls, settings: string): PasteState {
  const [text, setText] = useState('');
  const [checked, setChecked] = useState<{ text: string; settings: string; preview: PastePreview } | null>(
    null,
  );
  const [previewKey, setPreviewKey] = useState(0);
  const [busy, setBusy] = useState<PasteState['busy']>(null);
  const [remark, setRemark] = useState<PasteState['remark']>(null);
  const current = checked !== null && checked.text === text && checked.settings === settings;

  const show = (of: string, preview: PastePreview) => {
    setChecked({ text: of, settings, preview });
    setPreviewKey((key) => key + 1);
  };
  const refuse = (error: unknown) => {
    const problem = asProblem(error);
    const details = problem.errors.map(({ message }) => message).join(' ');
    setRemark({ severity: 'error', message: details || problem.message });
  };

  async function check(of = text): Promise<void> {
    setBusy('preview');
    setRemark(null);
    try {
      show(of, await calls.preview(of));
    } catch (error) {
      setChecked(null);
      refuse(error);
    } finally {
      setBusy(null);
    }
  }

  async function book(leaveOutWrong: boolean): ReturnType<PasteState['book']> {
    if (!current) return null;
    setBusy('book');
    setRemark(null);
    try {
      const said = await calls.book(text, checked.preview.token, leaveOutWrong);
      const rest = leaveOutWrong ? wrongRowsOf(text, checked.preview) : '';
      setText(rest);
      setChecked(null);
      if (rest === '') return { said, leftOut: false };
      const message = `${said} The rows that were left out are still here: mend them and check again, or close.`;
      setRemark({ severity: 'success', message });
      return { said, leftOut: true };
    } catch (error) {
      const problem = asProblem(error);
      if (problem.code === 'preview-outdated' && problem.current !== undefined) {
        show(text, problem.current as PastePreview);
        setRemark({ severity: 'warning', message: OUTDATED });
      } else refuse(error);
      return null;
    } finally {
      setBusy(null);
    }
  }

  return { text, setText, preview: current ? checked.preview : null, previewKey, busy, remark, check, book };
}
