import { HOUSE_LIMITS, type MeshGeometry } from '../gear-geometry/index.js';
import {
  formatContactRatio,
  formatErrorPercent,
  formatLength,
  formatTrimmed,
  ratioErrorPercent,
  withinTolerance,
  type Ratio,
} from '../units/index.js';
import { toNm } from './train-box.js';
import { type Box } from './train-option.js';
import { type TrainCheck, type TrainSpec, type Verdict } from './train-spec.js';

/** A figure this near to its limit, as a share of the limit, passes but is called marginal. */
const MARGINAL_SHARE = 0.05;
/** Lengths (modules) and ratios nearer to their limit than this count as on it. */
const ON_LIMIT = 1e-9;

/** Every requirement of a train held against it, the whole train first, then stage by stage. */
export function trainChecks(
  train: TrainSpec,
  ratio: Ratio,
  meshes: readonly MeshGeometry[],
  box: Box,
): TrainCheck[] {
  return [
    ...ratioCheck(train, ratio),
    ...boxChecks(train, box),
    ...meshes.flatMap((mesh, stage) => stageChecks(train, mesh, stage)),
  ];
}

function ratioCheck({ target }: TrainSpec, ratio: Ratio): TrainCheck[] {
  if (!target) return [];
  const value = ratioErrorPercent(ratio, target.ratio);
  const limit = Number(target.tolerancePercent);
  const passes = withinTolerance(ratio, target.ratio, target.tolerancePercent);
  const near = limit > 0 && Math.abs(value) > limit * (1 - MARGINAL_SHARE);
  const verdict = passes ? (near ? 'marginal' : 'passes') : 'fails';
  const error = formatErrorPercent(value);
  const message = {
    passes: `The ratio is ${error} off its target, within ± ${formatTrimmed(limit, 6)} %.`,
    marginal: `The ratio is ${error} off its target, only just within ± ${formatTrimmed(limit, 6)} %.`,
    fails: `The ratio is ${error} off its target; ± ${formatTrimmed(limit, 6)} % is allowed. Change a tooth count.`,
  }[verdict];
  return [{ code: 'ratio', label: 'Ratio error', value, limit, unit: '%', verdict, message }];
}

function boxChecks({ envelope }: TrainSpec, box: Box): TrainCheck[] {
  if (!envelope) return [];
  const mend = {
    length: 'Use smaller gears or more room along the line of axes.',
    width: 'Use narrower gears or fewer stages.',
    height: 'Use a smaller wheel.',
  };
  return (['length', 'width', 'height'] as const).flatMap((side): TrainCheck[] => {
    const limit = envelope[side];
    // A brief may leave a side open.
    if (limit === undefined || !Number.isFinite(limit)) return [];
    const value = box[side];
    const verdict: Verdict =
      toNm(value) > toNm(limit) ? 'fails' : value > limit * (1 - MARGINAL_SHARE) ? 'marginal' : 'passes';
    const words = `The train is ${formatLength(value)} ${SIDE_WORDS[side]}`;
    const message = {
      passes: `${words}; the box allows ${formatLength(limit)}.`,
      marginal: `${words} and only just fits the ${formatLength(limit)} of the box.`,
      fails: `${words}, ${formatLength(value - limit)} more than the box allows. ${mend[side]}`,
    }[verdict];
    const label = `Box ${side}`;
    return [{ code: `envelope-${side}`, label, value, limit, unit: 'mm', verdict, message }];
  });
}

const SIDE_WORDS = { length: 'long', width: 'wide', height: 'high' } as const;

function stageChecks(train: TrainSpec, mesh: MeshGeometry, stage: number): TrainCheck[] {
  const module = train.stages[stage]?.module ?? 1;
  return [
    contactCheck(mesh, train.leastContactRatio, stage),
    ...continuousCheck(mesh, stage),
    interferenceCheck(mesh, stage),
    backlashCheck(mesh, module, stage),
    ...(['pinion', 'wheel'] as const).flatMap((role) => [
      tipThicknessCheck(mesh, role, module, stage),
      tipClearanceCheck(mesh, role, module, stage),
      undercutCheck(mesh, role, stage),
    ]),
  ];
}

/** Verdict on a figure that must not be below its limit. */
function atLeast(value: number, limit: number, slack: number): Verdict {
  if (value < limit - slack) return 'fails';
  return value < limit * (1 + MARGINAL_SHARE) ? 'marginal' : 'passes';
}

function contactCheck(mesh: MeshGeometry, limit: number, stage: number): TrainCheck {
  const value = mesh.contactRatio;
  const verdict = atLeast(value, limit, ON_LIMIT);
  const words = `Stage ${stage + 1} has a contact ratio of ${formatContactRatio(value)}`;
  const message = {
    passes: `${words}; at least ${formatContactRatio(limit)} is asked for.`,
    marginal: `${words}, only just above the ${formatContactRatio(limit)} asked for.`,
    fails: `${words}; at least ${formatContactRatio(limit)} is asked for. Bring the shafts closer or use more teeth.`,
  }[verdict];
  return { code: 'contact-ratio', label: 'Contact ratio', value, limit, unit: '', verdict, stage, message };
}

/** Only where the teeth would lose contact: a low limit of the brief does not make that run. */
function continuousCheck(mesh: MeshGeometry, stage: number): TrainCheck[] {
  const value = mesh.totalContactRatio;
  if (value === null || value > 1) return [];
  const message = `Stage ${stage + 1} has a total contact ratio of ${formatContactRatio(value)}; above 1 is needed, or it runs in jerks. Bring the shafts closer or use more teeth.`;
  const label = 'Continuous contact';
  return [{ code: 'continuous-contact', label, value, limit: 1, unit: '', verdict: 'fails', stage, message }];
}

function interferenceCheck(mesh: MeshGeometry, stage: number): TrainCheck {
  const finding = mesh.findings.find(({ code }) => code === 'interference' || code === 'tip-hits-root');
  return {
    code: 'interference',
    label: 'Interference',
    value: finding?.value ?? null,
    limit: finding?.limit ?? null,
    unit: 'mm',
    verdict: finding ? 'fails' : 'passes',
    stage,
    message: finding
      ? `Stage ${stage + 1}: ${finding.message}`
      : `Stage ${stage + 1}: the tips run clear of the mating roots.`,
  };
}

function backlashCheck(mesh: MeshGeometry, module: number, stage: number): TrainCheck {
  const value = mesh.normalBacklash;
  const none = Math.abs(value) <= ON_LIMIT * module;
  const verdict = none ? 'marginal' : value < 0 ? 'fails' : 'passes';
  const words = `Stage ${stage + 1}`;
  const message = {
    passes: `${words} has ${formatLength(value)} of normal backlash.`,
    marginal: `${words} has no backlash at this distance: any tolerance makes the teeth jam. Move the shafts apart or thin the teeth.`,
    fails: `${words} jams by ${formatLength(-value)} of normal backlash. Move the shafts apart.`,
  }[verdict];
  return { code: 'backlash', label: 'Normal backlash', value, limit: 0, unit: 'mm', verdict, stage, message };
}

type Role = 'pinion' | 'wheel';

function tipThicknessCheck(mesh: MeshGeometry, role: Role, module: number, stage: number): TrainCheck {
  const value = mesh.gear[role].tipThickness;
  const limit = HOUSE_LIMITS.tipThickness * module;
  const verdict = atLeast(value, limit, ON_LIMIT * module);
  const words = `The teeth of the stage ${stage + 1} ${role} are ${formatLength(value)} thick at the tip`;
  const message = {
    passes: `${words}; at least ${formatLength(limit)} is asked for.`,
    marginal: `${words}, only just above the least ${formatLength(limit)}.`,
    fails: `${words}; at least ${formatLength(limit)} is asked for. Use less profile shift.`,
  }[verdict];
  const label = `Tip thickness, ${role}`;
  return { code: `tip-thickness-${role}`, label, value, limit, unit: 'mm', verdict, stage, message };
}

/** Below the house rule is marginal, as in the findings; only a tip that touches the root fails. */
function tipClearanceCheck(mesh: MeshGeometry, role: Role, module: number, stage: number): TrainCheck {
  const value = role === 'pinion' ? mesh.tipClearancePinion : mesh.tipClearanceWheel;
  const limit = HOUSE_LIMITS.tipClearance * module;
  const touches = value < -ON_LIMIT * module;
  const verdict = touches ? 'fails' : atLeast(value, limit, 0) === 'passes' ? 'passes' : 'marginal';
  const words = `The tips of the stage ${stage + 1} ${role}`;
  const message = {
    passes: `${words} clear the mating root by ${formatLength(value)}.`,
    marginal: `${words} clear the mating root by ${formatLength(value)}; the house rule is ${formatLength(limit)}.`,
    fails: `${words} run ${formatLength(-value)} into the mating root. Shorten the tips or move the shafts apart.`,
  }[verdict];
  const label = `Tip clearance, ${role}`;
  return { code: `tip-clearance-${role}`, label, value, limit, unit: 'mm', verdict, stage, message };
}

/** Undercut is no error: the contact ratio already counts it. */
function undercutCheck(mesh: MeshGeometry, role: Role, stage: number): TrainCheck {
  const { undercut, effectiveShift: value, leastShiftWithoutUndercut: limit } = mesh.gear[role];
  const words = `The stage ${stage + 1} ${role}`;
  return {
    code: `undercut-${role}`,
    label: `Profile shift against undercut, ${role}`,
    value,
    limit,
    unit: 'modules',
    verdict: undercut ? 'marginal' : 'passes',
    stage,
    message: undercut
      ? `${words} is undercut; the contact ratio counts it. A profile shift of ${formatTrimmed(limit, 4)} avoids it.`
      : `${words} is not undercut.`,
  };
}
