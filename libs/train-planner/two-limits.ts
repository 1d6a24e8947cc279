import { type CheckedRequest } from './option-request.js';
import { countOf, Explanation } from './explanation.js';
import { RELAXATIONS, type Relaxation } from './relaxations.js';
import { type StagePairs } from './stage-pairs.js';
import { type WhyNot } from './train-option.js';
import { type WorkWatch } from './work-watch.js';

/** Limits that mostly give way together with another one: more teeth need more room and a greater stage ratio. */
const FOLLOWING = ['stageRatio.max', 'envelope.length', 'envelope.height'];

const [leading, following] = [RELAXATIONS, RELAXATIONS].map((all, index) =>
  all.filter(({ limit }) => FOLLOWING.includes(limit) === (index === 1)),
) as [Relaxation[], Relaxation[]];

/**
 * For a stage count that no single limit keeps out: the least room and stage ratio, one after the other with the later
 * ones left free; or, where more must give, first the least figure of one other limit with all of those left free.
 * @returns null when that does not help either
 */
export function explainTogether(
  stages: number,
  request: CheckedRequest,
  stagePairs: StagePairs,
  watch: WorkWatch,
): WhyNot | null {
  const explain = (variant: CheckedRequest) => new Explanation(stages, variant, stagePairs, watch);
  const limited = following.filter((relaxation) => relaxation.current(request) !== null);
  const wide = wideEnough(request, explain(request).neededWidth());
  const free = explain(limited.reduce(freed, wide));
  const leadingReason = (): WhyNot | null => {
    for (const relaxation of leading) {
      const reason = free.limit(relaxation);
      if (reason) return reason;
    }
    return free.tolerance();
  };
  const reason = free.works() ? null : leadingReason();
  let settled = { ...wide, ...reason?.relaxed } as CheckedRequest;
  const needs: Need[] = wide === request ? [] : [widthNeed(wide, request)];
  limited.forEach((relaxation, index) => {
    const variant = limited.slice(index + 1).reduce(freed, settled);
    if (explain(variant).works()) return;
    const figure = explain(variant).limit(relaxation)?.nearest;
    if (typeof figure !== 'number') return;
    settled = { ...settled, ...relaxation.change(settled, figure) } as CheckedRequest;
    needs.push({
      limit: relaxation.limit,
      figure,
      words: relaxation.words(figure, request).rest.slice(0, -1),
    });
  });
  const [first] = needs;
  if (!first || !explain(settled).works()) return null;
  const { envelope, stageRatio } = settled;
  const room = needs.map(({ words }) => words).join(', and ');
  return {
    stages,
    limit: reason?.limit ?? first.limit,
    message: reason
      ? `${reason.message} That also takes ${room}.`
      : `${countOf(stages)} ${stages === 1 ? 'needs' : 'need'} ${room}.`,
    nearest: reason?.nearest ?? first.figure,
    relaxed: {
      ...reason?.relaxed,
      stages: { min: stages, max: stages },
      stageRatio,
      ...(envelope ? { envelope } : {}),
    },
  };
}

/** A limit that must give, and what it must become. */
interface Need {
  limit: string;
  figure: number;
  words: string;
}

function freed(request: CheckedRequest, relaxation: Relaxation): CheckedRequest {
  const figure = relaxation.loosest / relaxation.perUnit;
  return { ...request, ...relaxation.change(request, figure) } as CheckedRequest;
}

function wideEnough(request: CheckedRequest, needed: number): CheckedRequest {
  const { envelope } = request;
  if (envelope?.width === undefined || envelope.width >= needed) return request;
  return { ...request, envelope: { ...envelope, width: needed } };
}

function widthNeed({ envelope }: CheckedRequest, before: CheckedRequest): Need {
  const figure = envelope?.width ?? 0;
  const words = `a width of at least ${figure.toFixed(2)} mm; the box allows ${before.envelope?.width} mm`;
  return { limit: 'envelope.width', figure, words };
}
