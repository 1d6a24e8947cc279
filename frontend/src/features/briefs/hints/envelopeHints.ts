import { gearGeometry } from '@stageyard/libs/gear-geometry';
import { leastTrain, type LeastTrain } from '@stageyard/libs/train-planner';
import { figure, stageCount, type Hint, type HintBasis } from './hint';

/** Does anything at all fit the box? Only figures that every possible train exceeds are held against it. */
export function envelopeHints(basis: HintBasis): Hint[] {
  const { envelope } = basis.requirement;
  if (!envelope) return [];
  const wall = envelope.wall ?? 0;
  const walls = wall > 0 ? ` and two walls of ${figure(wall)} mm` : '';
  return [
    heightHint(basis, envelope.height, wall, walls),
    lengthHint(basis, envelope.length, wall, walls),
    widthHint(basis, envelope.width, wall, walls),
  ].filter((hint) => hint !== null);
}

/** At least one wheel has the ratio's root as its own ratio, and it must stand in the height. */
function heightHint(basis: HintBasis, height: number | undefined, wall: number, walls: string): Hint | null {
  if (height === undefined) return null;
  const { teeth, stages } = basis.requirement;
  const wheelTeeth = Math.min(
    teeth.wheel.max,
    Math.max(teeth.wheel.min, bound(basis, stages.max).wheelTeeth),
  );
  const tip = tipDiameter(basis, wheelTeeth);
  const need = tip + 2 * wall;
  if (need <= height) return null;
  return {
    field: 'envelopeHeight',
    kind: 'crossed',
    message: `Height ${figure(height)} mm: a wheel of ${wheelTeeth} teeth at m ${figure(basis.smallestModule, 4)}${walls} needs ${figure(need)} mm.`,
  };
}

/** The axes stand in line: the shortest chain of stages has equal ratios and the smallest pinions. */
function lengthHint(basis: HintBasis, length: number | undefined, wall: number, walls: string): Hint | null {
  if (length === undefined) return null;
  const { teeth, stages } = basis.requirement;
  const ends = (tipDiameter(basis, teeth.pinion.min) + tipDiameter(basis, teeth.wheel.min)) / 2;
  let best = { need: Infinity, count: stages.min };
  for (let count = stages.min; count <= stages.max; count += 1) {
    const need = bound(basis, count).centreDistanceSum + ends + 2 * wall;
    if (need < best.need) best = { need, count };
  }
  if (best.need <= length) return null;
  return {
    field: 'envelopeLength',
    kind: 'crossed',
    message: `Length ${figure(length)} mm: ${stageCount(best.count)} at m ${figure(basis.smallestModule, 4)}${walls} need at least ${figure(best.need, 0)} mm in line.`,
  };
}

/** Every stage has a plane of its own, one face width thick. */
function widthHint(basis: HintBasis, width: number | undefined, wall: number, walls: string): Hint | null {
  if (width === undefined) return null;
  const { stages, faceWidthFactor = 10 } = basis.requirement;
  const face = Math.ceil(faceWidthFactor * basis.smallestModule - 1e-9);
  const need = stages.min * face + 2 * wall;
  if (need <= width) return null;
  return {
    field: 'envelopeWidth',
    kind: 'crossed',
    message: `Width ${figure(width)} mm: ${stageCount(stages.min)} of ${face} mm face width${walls} need at least ${figure(need)} mm.`,
  };
}

function bound({ requirement, least, smallestModule, helixAngleDeg }: HintBasis, stages: number): LeastTrain {
  return leastTrain(stages, least, requirement.teeth.pinion.min, smallestModule, helixAngleDeg);
}

function tipDiameter(basis: HintBasis, teeth: number): number {
  const { smallestModule: module, pressureAngleDeg, helixAngleDeg } = basis;
  return gearGeometry({ teeth, module, pressureAngleDeg, helixAngleDeg }).tipDiameter;
}
