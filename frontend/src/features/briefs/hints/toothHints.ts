import { gearGeometry, meshGeometry, shiftForPolicy } from '@stageyard/libs/gear-geometry';
import { seriesOf } from '../form/isoModules';
import { figure, type Hint, type HintBasis } from './hint';

/** Where undercut begins, and what the brief's choice of shift makes of it. */
export function undercutHints(basis: HintBasis): Hint[] {
  const { pinion } = basis.requirement.teeth;
  const first = firstTeethWithoutUndercut(basis);
  if (pinion.min >= first) return [];
  const angle = `${figure(basis.pressureAngleDeg)}°`;
  const from = `Pinion from ${pinion.min} teeth: undercut below ${first} (${angle})`;
  if (basis.requirement.shiftPolicy === 'clear-undercut') {
    const shift = gear(basis, pinion.min).leastShiftWithoutUndercut;
    const message = `${from}; a shift of ${figure(shift, 3)} clears it at ${pinion.min} teeth and moves the axes apart.`;
    return [{ field: 'pinionMin', kind: 'note', message }];
  }
  if (basis.requirement.undercut === 'refuse') {
    const none = pinion.max < first;
    const rest = none
      ? `and undercut is refused, so no pinion up to ${pinion.max} is left.`
      : `and refused, so pinions begin at ${first}.`;
    return [{ field: 'pinionMin', kind: none ? 'crossed' : 'note', message: `${from}, ${rest}` }];
  }
  return [
    {
      field: 'pinionMin',
      kind: 'note',
      message: `${from}; it is allowed, and the contact ratio given already counts what it costs.`,
    },
  ];
}

function gear({ smallestModule, pressureAngleDeg, helixAngleDeg }: HintBasis, teeth: number) {
  return gearGeometry({ teeth, module: smallestModule, pressureAngleDeg, helixAngleDeg });
}

/** Smallest tooth count the standard rack does not undercut, by the geometry itself. */
function firstTeethWithoutUndercut(basis: HintBasis): number {
  let teeth = basis.requirement.teeth.pinion.min;
  while (teeth < 60 && gear(basis, teeth).undercut) teeth += 1;
  return teeth;
}

/** What the centre-distance allowance leaves of the contact ratio, for the smallest and the largest pair. */
export function contactHints(basis: HintBasis): Hint[] {
  const { teeth, leastContactRatio = 1.2, centreDistanceAllowance = 0 } = basis.requirement;
  const hints: Hint[] = [];
  if (leastContactRatio <= 1) {
    hints.push({
      field: 'leastContactRatio',
      kind: 'note',
      message: `Least contact ratio ${figure(leastContactRatio, 3)}: a spur gear runs without a break only above 1.`,
    });
  }
  const largest = pairAt(basis, teeth.pinion.max, teeth.wheel.max);
  const smallest = pairAt(basis, teeth.pinion.min, Math.max(teeth.wheel.min, teeth.pinion.min));
  const allowance = `Allowance ${figure(centreDistanceAllowance, 4)} m leaves`;
  if (largest && largest.contactRatio < leastContactRatio) {
    const room = largest.allowanceAtLeastContactRatio;
    const advice = room !== null && room > 0 ? ` Up to ${figure(room, 3)} m would do for them.` : '';
    hints.push({
      field: centreDistanceAllowance > 0 ? 'centreDistanceAllowance' : 'leastContactRatio',
      kind: 'crossed',
      message: `${allowance} a contact ratio of ${largest.contactRatio.toFixed(3)} even between ${largest.words}; the least asked is ${figure(leastContactRatio, 3)}.${advice}`,
    });
  } else if (smallest && smallest.contactRatio < leastContactRatio) {
    hints.push({
      field: centreDistanceAllowance > 0 ? 'centreDistanceAllowance' : 'leastContactRatio',
      kind: 'note',
      message: `${allowance} a contact ratio of ${smallest.contactRatio.toFixed(3)} between ${smallest.words}, less than the ${figure(leastContactRatio, 3)} asked: such pairs are ruled out.`,
    });
  }
  return hints;
}

function pairAt(basis: HintBasis, pinionTeeth: number, wheelTeeth: number) {
  const { smallestModule: module, pressureAngleDeg, helixAngleDeg, requirement } = basis;
  const { leastContactRatio = 1.2, centreDistanceAllowance = 0, shiftPolicy = 'none' } = requirement;
  const shared = { module, pressureAngleDeg, helixAngleDeg };
  // A helical pair needs opposite hands; which is which changes no figure here.
  const helical = helixAngleDeg > 0;
  const pinion = { ...shared, teeth: pinionTeeth, ...(helical ? { hand: 'right' as const } : {}) };
  const wheel = { ...shared, teeth: wheelTeeth, ...(helical ? { hand: 'left' as const } : {}) };
  try {
    const { pinionShift, wheelShift } = shiftForPolicy({ pinion, wheel, policy: shiftPolicy });
    const mesh = meshGeometry({
      pinion: { ...pinion, profileShift: pinionShift },
      wheel: { ...wheel, profileShift: wheelShift },
      allowance: centreDistanceAllowance,
      leastContactRatio,
    });
    return { ...mesh, words: `${pinionTeeth} and ${wheelTeeth} teeth` };
  } catch {
    // A pair that cannot be made is the planner's to refuse; a hint has nothing to add.
    return null;
  }
}

/** Modules outside ISO 54, and what several modules mean while strength is not rated. */
export function moduleHints({ requirement, smallestModule }: HintBasis): Hint[] {
  const special = requirement.modules.filter((module) => seriesOf(module) === 'none');
  const hints: Hint[] = special.map((module) => ({
    field: 'modules',
    kind: 'note',
    message: `Module ${figure(module, 4)} mm is not in ISO 54; expect a special cutter.`,
  }));
  if (requirement.modules.length > 1) {
    hints.push({
      field: 'modules',
      kind: 'note',
      message: `Strength is not rated yet, so every stage takes the smallest module, m ${figure(smallestModule, 4)}.`,
    });
  }
  return hints;
}
