import { useCallback } from 'react';
import { useSearchParams } from 'react-router-dom';
import { nextOrder, readOrder, readStages, writeOrder, type OptionSort } from './optionOrder';

/** Stage filter and order of the option table, held in the address. */
export function useOptionView() {
  const [params, setParams] = useSearchParams();
  const order = readOrder(params.get('sort'));
  const stages = readStages(params.get('stages'));

  const set = useCallback(
    (name: string, value: string | null) =>
      setParams(
        (before) => {
          const after = new URLSearchParams(before);
          if (value === null || value === '') after.delete(name);
          else after.set(name, value);
          return after;
        },
        { replace: true, preventScrollReset: true },
      ),
    [setParams],
  );

  return {
    order,
    stages,
    sortBy: (by: OptionSort) => set('sort', writeOrder(nextOrder(order, by))),
    setStages: (counts: readonly number[]) => set('stages', [...counts].sort().join(',')),
  };
}
