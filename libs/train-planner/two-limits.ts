import { type CheckedRequest } from './option-request.js';
import { Explanation } from './explanation.js';
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
 * For a stage count that no single limit keeps out: the least figure of one limit with room and stage ratio left
 * free, and then the least room and stage ratio at that figure, one after the other.
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
  const roomy = limited.reduce(freed, wideEnough(request, explain(request).neededWidth()));
  const free = explain(roomy);
  for (const attempt of [...leading.map((limit) => () => free.limit(limit)), () => free.tolerance()]) {
    const reason = attempt();
    if (!reason) continue;
    let settled = {
      ...wideEnough(request, explain(request).neededWidth()),
      ...reason.relaxed,
    } as CheckedRequest;
    const also = settled.envelope?.width === request.envelope?.width ? [] : [widthWords(settled, request)];
    limited.forEach((relaxation, index) => {
      const variant = limited.slice(index + 1).reduce(freed, settled);
      if (explain(variant).works()) return;
      const figure = explain(variant).limit(relaxation)?.nearest;
      if (typeof figure !== 'number') return;
      settled = { ...settled, ...relaxation.change(settled, figure) } as CheckedRequest;
      also.push(relaxation.words(figure, request).rest.replace(/\.$/, ''));
    });
    if (also.length === 0 || !explain(settled).works()) continue;
    const { envelope, stageRatio } = settled;
    return {
      ...reason,
      message: `${reason.message} That also takes ${also.join(', and ')}.`,
      relaxed: { ...reason.relaxed, stageRatio, ...(envelope ? { envelope } : {}) },
    };
  }
  return null;
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

function widthWords({ envelope }: CheckedRequest, before: CheckedRequest): string {
  return `a width of at least ${envelope?.width?.toFixed(2)} mm; the box allows ${before.envelope?.width} mm`;
}
