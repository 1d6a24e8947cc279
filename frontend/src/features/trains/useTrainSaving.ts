import { useState } from 'react';
import { keepTrain } from '../../api/hooks/useTrain';
import { asProblem, type FieldProblem } from '../../api/problem';
import type { Train } from '../../api/types';

/**
 * Saving a part of a train: what was typed stays on a refusal; when somebody saved in between, their version is told
 * and shown, and the next save goes over it.
 */
export function useTrainSaving() {
  const [problem, setProblem] = useState<string | null>(null);
  const [issues, setIssues] = useState<readonly FieldProblem[]>([]);
  const [busy, setBusy] = useState(false);

  async function run(save: () => Promise<Train>): Promise<Train | null> {
    setBusy(true);
    setProblem(null);
    setIssues([]);
    try {
      return await save();
    } catch (error) {
      const refusal = asProblem(error);
      setIssues(refusal.errors);
      if (refusal.changedMeanwhile && refusal.current) {
        await keepTrain(refusal.current as Train);
        setProblem(
          'Somebody else saved this train while you were typing. The page now shows their version; what you typed is still here. Save again to put it over theirs, or cancel.',
        );
      } else {
        setProblem(refusal.message);
      }
      return null;
    } finally {
      setBusy(false);
    }
  }

  return {
    problem,
    issues,
    busy,
    run,
    clear: () => {
      setProblem(null);
      setIssues([]);
    },
  };
}
