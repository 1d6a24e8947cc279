import { describeTrain, type TrainFigures } from '@stageyard/libs/train-planner';
import { type AdoptedSpec, gearsOf, gearsOnShaft, placeName } from './adopted-spec.js';
import { STARTING_DIAMETER, rootLimit } from './shaft-diameters.js';

/** What the choice of parts and shafts needs to know of a stock gear. */
export interface StockGear {
  number: string;
  bore: number | null;
  standing: 'draft' | 'cleared' | 'withdrawn';
}

type TrainFinding = TrainFigures['findings'][number];
type TrainCheck = TrainFigures['checks'][number];

/**
 * Every figure of a train, with what its shafts and chosen parts give rise to.
 * @param stock the chosen parts by number; a number that is missing here is no longer in the library
 */
export function trainFigures(spec: AdoptedSpec, stock: ReadonlyMap<string, StockGear>): TrainFigures {
  const figures = describeTrain(spec);
  return {
    ...figures,
    findings: [...figures.findings, ...shaftFindings(spec), ...partFindings(spec, stock)],
    checks: [...figures.checks, ...shaftChecks(spec, figures)],
  };
}

/** Each shaft against the least diameter for its torque, where one is known. */
function shaftChecks(spec: AdoptedSpec, figures: TrainFigures): TrainCheck[] {
  return spec.shafts.flatMap(({ diameter }, index): TrainCheck[] => {
    const limit = figures.shafts[index]?.leastDiameter ?? null;
    if (limit === null) return [];
    const holds = diameter >= limit;
    const mend = holds ? '' : ' Thicken it, or take larger gears so that there is room for it.';
    const message = `Shaft ${index} is ${diameter} mm; torsion needs at least ${limit} mm.${mend}`;
    const verdict = holds ? ('passes' as const) : ('fails' as const);
    const label = `Diameter of shaft ${index}`;
    return [{ code: 'shaft-diameter', label, value: diameter, limit, unit: 'mm', verdict, message }];
  });
}

function shaftFindings(spec: AdoptedSpec): TrainFinding[] {
  return spec.shafts.flatMap(({ diameter, basis }, index): TrainFinding[] => {
    const found: TrainFinding[] = [];
    if (basis === 'start') {
      const message = `Shaft ${index} starts at ${STARTING_DIAMETER} mm or what fits, since no torque and no stock bore is known. Give a torque in the brief, or type a diameter.`;
      found.push({ code: 'shaft-not-sized', severity: 'note', message, value: diameter });
    }
    for (const placed of gearsOnShaft(spec, index)) {
      const limit = rootLimit(spec, placed);
      if (diameter <= limit) continue;
      const { stage } = placed;
      const message = `Shaft ${index} is ${diameter} mm; inside the teeth of the ${placeName(placed).toLowerCase()} there is room for ${limit} mm.`;
      found.push({ code: 'shaft-over-root', severity: 'fail', message, value: diameter, limit, stage });
    }
    return found;
  });
}

function partFindings(spec: AdoptedSpec, stock: ReadonlyMap<string, StockGear>): TrainFinding[] {
  return gearsOf(spec).flatMap(({ gear, stage, role }): TrainFinding[] => {
    if (gear.partNumber === null) return [];
    const name = `${placeName({ stage, role })}, ${gear.partNumber},`;
    const part = stock.get(gear.partNumber);
    if (!part || part.standing !== 'cleared') {
      const state = part ? `is ${part.standing}` : 'is not in the library';
      const message = `${name} ${state}. Choose a cleared part, or have it made.`;
      return [{ code: 'part-not-cleared', severity: 'marginal', message, stage }];
    }
    const diameter = spec.shafts[role === 'pinion' ? stage : stage + 1]?.diameter;
    if (diameter === undefined || part.bore === null || part.bore === diameter) return [];
    const turned =
      part.bore < diameter ? 'Turn the shaft down there, or bore the gear out.' : 'Thicken the shaft.';
    const message = `${name} has a bore of ${part.bore} mm; its shaft is ${diameter} mm. ${turned}`;
    return [
      { code: 'bore-differs', severity: 'marginal', message, value: part.bore, limit: diameter, stage },
    ];
  });
}
