import { figure, stageCount, type Hint, type HintBasis } from './hint';

/** Can the ratio be reached with these teeth and stage ratios, count by count? */
export function ratioHints(basis: HintBasis): Hint[] {
  const { stages } = basis.requirement;
  const hints: Hint[] = [];
  for (let count = stages.min; count <= stages.max; count += 1) {
    const hint = tooMuch(basis, count) ?? tooLittle(basis, count);
    if (hint) hints.push(hint);
  }
  const everyCountFails = hints.length === stages.max - stages.min + 1;
  return hints.map((hint) => ({ ...hint, kind: everyCountFails ? 'crossed' : 'note' }));
}

function tooMuch({ requirement, target, least }: HintBasis, count: number): Hint | null {
  const { pinion, wheel } = requirement.teeth;
  const byTeeth = wheel.max / pinion.min;
  const stageMax = requirement.stageRatio?.max;
  const byLimit = stageMax === undefined ? Infinity : Number(stageMax);
  if (least <= Math.min(byTeeth, byLimit) ** count * (1 + 1e-12)) return null;
  const each = target ** (1 / count);
  const inEach = count === 1 ? '' : ' in each';
  if (byLimit < byTeeth) {
    return {
      field: 'stageRatioMax',
      kind: 'note',
      message: `Ratio ${figure(target, 4)} in ${stageCount(count)} needs ${figure(each)}${inEach}; the stage ratio ends at ${figure(byLimit, 4)}.`,
    };
  }
  const teeth = Math.ceil(pinion.min * each - 1e-9);
  return {
    field: 'wheelMax',
    kind: 'note',
    message: `Ratio ${figure(target, 4)} in ${stageCount(count)} needs a wheel of ${teeth} teeth with a ${pinion.min}-tooth pinion${inEach}; wheel teeth end at ${wheel.max}.`,
  };
}

function tooLittle({ requirement, target, greatest }: HintBasis, count: number): Hint | null {
  const { pinion, wheel } = requirement.teeth;
  const byTeeth = wheel.min / pinion.max;
  const byLimit = Number(requirement.stageRatio?.min ?? 1);
  const leastEach = Math.max(byTeeth, byLimit);
  if (greatest >= leastEach ** count * (1 - 1e-12)) return null;
  const reason =
    byTeeth > byLimit
      ? `the smallest wheel, ${wheel.min} teeth, on the largest pinion, ${pinion.max}, already gives ${figure(byTeeth, 3)}`
      : `stage ratios begin at ${figure(byLimit, 4)}`;
  const together = count === 1 ? '' : `, together ${figure(leastEach ** count, 3)}`;
  return {
    field: byTeeth > byLimit ? 'wheelMin' : 'stageRatioMin',
    kind: 'note',
    message: `Ratio ${figure(target, 4)} is too small for ${stageCount(count)}: ${reason}${together}.`,
  };
}

/** Each external mesh reverses the rotation: an even count keeps it. */
export function directionHints({ requirement }: HintBasis): Hint[] {
  const { direction = 'any', stages } = requirement;
  if (direction === 'any') return [];
  const fits = (count: number) => (count % 2 === 0) === (direction === 'same');
  const fitting: number[] = [];
  for (let count = stages.min; count <= stages.max; count += 1) if (fits(count)) fitting.push(count);
  const wish = direction === 'same' ? 'the same way as the input' : 'against the input';
  const parity = direction === 'same' ? 'an even' : 'an odd';
  if (fitting.length === stages.max - stages.min + 1) return [];
  if (fitting.length === 0) {
    const asked =
      stages.min === stages.max ? stageCount(stages.min) : `${stages.min} to ${stages.max} stages`;
    return [
      {
        field: 'direction',
        kind: 'crossed',
        message: `An output turning ${wish} needs ${parity} number of stages; the brief allows ${asked}.`,
      },
    ];
  }
  return [
    {
      field: 'direction',
      kind: 'note',
      message: `An output turning ${wish} needs ${parity} number of stages, so only ${fitting.map(stageCount).join(' and ')} can serve.`,
    },
  ];
}

/** What a tolerance of nothing means. */
export function toleranceHints({ requirement, target }: HintBasis): Hint[] {
  if (Number(requirement.ratio.tolerancePercent) !== 0) return [];
  return [
    {
      field: 'tolerancePercent',
      kind: 'note',
      message: `Tolerance 0 % keeps only trains whose tooth counts give ${figure(target, 6)} exactly.`,
    },
  ];
}
