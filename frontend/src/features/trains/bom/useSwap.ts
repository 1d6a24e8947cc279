import { useState } from 'react';
import useSWR from 'swr';
import { bookSwap, trySwap } from '../../../api/hooks/useBomEdits';
import { readBom } from '../../../api/hooks/useTrainBom';
import { asProblem } from '../../../api/problem';
import type { BomLine, SwapResult, Train } from '../../../api/types';
import { useNotices } from '../../../components/Notices';
import { useTrainSaving } from '../useTrainSaving';

/** Stands for the kit's own part among the choices; no part number is written like this. */
export const ORIGINAL = ' original';

/**
 * Choosing a part for a line: what it would change, booking it, and taking it back. When somebody changed the train
 * meanwhile the choice stays, and what it changes is worked out again for the train as it stands now.
 */
export function useSwap(train: Train, line: BomLine, onBooked: () => void) {
  const [choice, setChoice] = useState<string | null>(null);
  const saving = useTrainSaving();
  const { tell } = useNotices();
  const partNumber = choice === ORIGINAL ? null : choice;
  const swap = { version: train.version, key: line.key, partNumber };
  const attempt = useSWR<SwapResult, unknown>(
    choice === null ? null : ['try a swap', train.code, train.version, line.key, choice],
    () => trySwap(train.code, swap),
    {
      revalidateOnFocus: false,
      shouldRetryOnError: false,
      // The same words as when booking is refused: a change meanwhile is shown, the choice stays.
      onError: (error: unknown) => void saving.run(() => Promise.reject(asProblem(error)), train),
    },
  );

  async function undo(saved: Train): Promise<void> {
    try {
      const { lines } = await readBom(saved.code);
      const same = lines.some(({ key }) => key === line.key);
      // A gear's line is called after the gear itself: it is found by the part that was taken.
      const key = same ? line.key : (lines.find((each) => each.partNumber === choice)?.key ?? line.key);
      // What stood there before: the kit's own part, or one that somebody had chosen already.
      const before = same && line.replaces === null ? null : line.partNumber;
      await bookSwap(saved.code, { version: saved.version, key, partNumber: before });
      tell(`Find ${line.findNumber}: as it was before.`);
    } catch (error) {
      tell(`It could not be undone. ${asProblem(error).message}`);
    }
  }

  async function book(): Promise<void> {
    if (choice === null) return;
    const saved = await saving.run(() => bookSwap(train.code, swap), train);
    if (!saved) return;
    const words = choice === ORIGINAL ? 'the original part is back' : `${choice} taken`;
    tell(`Find ${line.findNumber}: ${words}.`, { name: 'Undo', run: () => void undo(saved) });
    onBooked();
  }

  return {
    choice,
    choose: (value: string) => {
      saving.clear();
      setChoice(value);
    },
    preview: attempt.data ?? null,
    trying: attempt.isLoading,
    booking: saving.busy,
    book,
    problem:
      [saving.problem, ...saving.issues.map(({ message }) => message)].filter(Boolean).join(' ') || null,
  };
}
