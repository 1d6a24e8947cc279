import { saveExtraLines } from '../../../api/hooks/useBomEdits';
import { keepTrain } from '../../../api/hooks/useTrain';
import { asProblem } from '../../../api/problem';
import type { BomLine, ExtraLine, Train } from '../../../api/types';
import { useNotices } from '../../../components/Notices';

/** Takes an added line away at once; it can be put back from the notice. */
export function useRemoveLine(train: Train, extraLines: readonly ExtraLine[]) {
  const { tell } = useNotices();

  async function attempt(
    version: number,
    lines: Parameters<typeof saveExtraLines>[2],
  ): Promise<Train | null> {
    try {
      return await saveExtraLines(train.code, version, lines);
    } catch (error) {
      const problem = asProblem(error);
      if (problem.changedMeanwhile && problem.current) await keepTrain(problem.current as Train);
      tell(
        problem.changedMeanwhile
          ? 'Somebody else changed this train meanwhile; the page now shows their version. Nothing was taken away or put back.'
          : problem.message,
      );
      return null;
    }
  }

  return async ({ extraLineId, findNumber, description }: BomLine): Promise<void> => {
    const saved = await attempt(
      train.version,
      extraLines.filter(({ id }) => id !== extraLineId),
    );
    if (!saved) return;
    // A line that was taken away comes back as a new one.
    const back = extraLines.map((line) => (line.id === extraLineId ? { ...line, id: null } : line));
    tell(`Find ${findNumber}, ${description}: taken away.`, {
      name: 'Undo',
      run: () => void attempt(saved.version, back),
    });
  };
}
