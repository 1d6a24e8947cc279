import { useState } from 'react';
import { keepTrain } from '../../api/hooks/useTrain';
import { asProblem, type FieldProblem } from '../../api/problem';
import type { Train } from '../../api/types';
import { trainDifferences } from './trainDifferences';

const TYPED =
  'Somebody else saved this train while you were typing. The page now shows their version; what you typed is still here. Save again to put it over theirs, or cancel.';

/**
 * Saving a part of a train: what was typed stays on a refusal; when somebody saved in between, their version is told
 * and shown, and the next save goes over it.
 */
export function useTrainSaving() {
  const [problem, setProblem] = useState<string | null>(null);
  const [issues, setIssues] = useState<readonly FieldProblem[]>([]);
  const [busy, setBusy] = useState(false);

  /** @param seen the train as this page showed it: a choice (nothing typed) then says what changed meanwhile */
  async function run<Saved>(save: () => Promise<Saved>, seen?: Train): Promise<Saved | null> {
    setBusy(true);
    setProblem(null);
    setIssues([]);
    try {
      return await save();
    } catch (error) {
      const refusal = asProblem(error);
      setIssues(refusal.errors);
      if (refusal.changedMeanwhile && refusal.current) {
        const current = refusal.current as Train;
        await keepTrain(current);
        setProblem(seen ? chosenMeanwhile(seen, current) : TYPED);
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

function chosenMeanwhile(seen: Train, current: Train): string {
  const changes = trainDifferences(seen, current);
  const what = changes.length === 0 ? '' : ` Changed meanwhile: ${changes.join('; ')}.`;
  return `Somebody else changed this train meanwhile; the page now shows their version.${what} Nothing of yours is booked yet, and your choice still stands here: look at it again, then book it or cancel.`;
}
