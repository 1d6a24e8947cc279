import { useState } from 'react';
import { saveTrain } from '../../../api/hooks/useTrain';
import type { Train } from '../../../api/types';
import { readDecimal } from '../../../components/decimalText';
import { useNotices } from '../../../components/Notices';
import { useTrainSaving } from '../useTrainSaving';

const textsOf = (train: Train): string[] => train.spec.shafts.map(({ diameter }) => String(diameter));

/** Shaft diameters as typed; saving sends one figure a shaft, and a refusal lands at its shaft. */
export function useShaftForm(train: Train, onSaved: () => void) {
  const [typed, setTyped] = useState(() => textsOf(train));
  const [unread, setUnread] = useState<Record<number, string>>({});
  const { tell } = useNotices();
  const saving = useTrainSaving();

  async function save(): Promise<void> {
    const readings = typed.map((text) => readDecimal(text));
    const bad: Record<number, string> = {};
    const diameters = readings.map((reading, index) => {
      if (reading.kind === 'number') return reading.value;
      if (reading.kind === 'problem') bad[index] = reading.message;
      return null;
    });
    setUnread(bad);
    if (Object.keys(bad).length > 0) return;
    const saved = await saving.run(() =>
      saveTrain(train.code, { version: train.version, shaftDiameters: diameters }),
    );
    if (!saved) return;
    setTyped(textsOf(saved));
    tell('Shaft diameters saved.');
    onSaved();
  }

  return {
    typed,
    type: (index: number, text: string) =>
      setTyped((before) => before.map((each, at) => (at === index ? text : each))),
    dirty: typed.join() !== textsOf(train).join(),
    issues: { ...issuesByShaft(saving.issues), ...unread },
    problem: saving.problem,
    saving: saving.busy,
    reset: () => {
      setTyped(textsOf(train));
      setUnread({});
      saving.clear();
    },
    save,
  };
}

function issuesByShaft(issues: readonly { field: string; message: string }[]): Record<number, string> {
  const found: Record<number, string> = {};
  for (const { field, message } of issues) {
    const index = /^shaftDiameters\.(\d+)$/.exec(field)?.[1];
    if (index !== undefined) found[Number(index)] = message;
  }
  return found;
}
