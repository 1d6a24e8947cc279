import { formatContactRatio, formatLength } from '../units/index.js';
import { plain } from './check-fields.js';
import { thicknessAt } from './gear-radii.js';
import { HOUSE_LIMITS } from './limits.js';
import { type Finding, type MeshGeometry } from './results.js';
import { cornerBite, rootVerdict } from './tip-corner.js';
import { type GearFigures, type Pair, type PairLimits, type ResolvedGear } from './types.js';

/** Lengths (modules) and ratios nearer to their limit than this are judged as on it. */
const JUDGING_SLACK = 1e-9;

/** Everything a designer should know about a pair, gravest first. Lengths in mm, shifts in modules. */
export function meshFindings(pair: Pair, mesh: MeshGeometry, limits: PairLimits): Finding[] {
  const { pinion, wheel, p, w } = pair;
  const findings: Finding[] = [
    ...contactFindings(mesh, limits.contactRatio),
    ...rootFindings('pinion', 'wheel', p, w, mesh.centreDistance),
    ...rootFindings('wheel', 'pinion', w, p, mesh.centreDistance),
    ...backlashFindings(mesh, pinion.module),
    ...clearanceFindings('pinion', 'wheel', mesh.tipClearancePinion, pinion.module),
    ...clearanceFindings('wheel', 'pinion', mesh.tipClearanceWheel, pinion.module),
    ...tipFindings('pinion', pinion, p, limits.tipThickness),
    ...tipFindings('wheel', wheel, w, limits.tipThickness),
    ...undercutFindings('pinion', pinion, p),
    ...undercutFindings('wheel', wheel, w),
  ];
  const rank = { fail: 0, marginal: 1, note: 2 };
  return findings.sort((a, b) => rank[a.severity] - rank[b.severity]);
}

type Role = 'pinion' | 'wheel';

function contactFindings(mesh: MeshGeometry, least: number): Finding[] {
  const findings: Finding[] = [];
  const ratio = mesh.contactRatio;
  if (mesh.totalContactRatio === null && ratio <= 1) {
    findings.push({
      code: 'face-width-missing',
      severity: 'marginal',
      message: `The transverse contact ratio is ${formatContactRatio(ratio)}; whether the helix makes up for it depends on the face width. Enter one.`,
      value: ratio,
      limit: 1,
    });
  } else if (mesh.totalContactRatio !== null && mesh.totalContactRatio <= 1) {
    findings.push({
      code: 'contact-not-continuous',
      severity: 'fail',
      message: `The total contact ratio is ${formatContactRatio(mesh.totalContactRatio)}; above 1 is needed, or the drive runs in jerks. Bring the shafts closer or use more teeth.`,
      value: mesh.totalContactRatio,
      limit: 1,
    });
  }
  if (ratio < least - JUDGING_SLACK) {
    findings.push({
      code: 'contact-ratio-low',
      severity: 'fail',
      message: `The contact ratio is ${formatContactRatio(ratio)}; at least ${formatContactRatio(least)} is required. Bring the shafts closer or use more teeth.`,
      value: ratio,
      limit: least,
    });
  }
  if (mesh.contactRatioLimitedBy !== null && ratio > 0) {
    findings.push({
      code: 'contact-ratio-cut',
      severity: 'note',
      message: `The textbook contact ratio ${formatContactRatio(mesh.contactRatioIgnoringUndercut)} does not hold. ${mesh.contactRatioLimitedBy}`,
      value: ratio,
      limit: mesh.contactRatioIgnoringUndercut,
    });
  }
  return findings;
}

function rootFindings(role: Role, mate: Role, gear: GearFigures, other: GearFigures, a: number): Finding[] {
  const verdict = rootVerdict(gear, other, a);
  if (verdict === 'clear') return [];
  const bases = gear.base + other.base;
  const lowest = Math.sqrt(Math.max(0, (a - bases) * (a + bases))) - other.tipReach;
  if (verdict === 'contact-lost') {
    return [
      {
        code: 'contact-lost',
        severity: 'note',
        message: `The ${mate}'s tip passes through the hollow that undercut left in the ${role}: it runs clear, but contact is lost there.`,
        value: lowest,
        limit: gear.formReach,
      },
    ];
  }
  if (gear.undercut) {
    const bite = cornerBite(gear, other, a);
    return [
      {
        code: 'interference',
        severity: 'fail',
        message: `The ${mate}'s tip corner runs ${bite.toFixed(3)} mm into the ${role}'s tooth. Give the ${role} more profile shift, shorten the ${mate}'s tips or use more ${role} teeth.`,
        value: bite,
        limit: gear.module * 1e-3,
      },
    ];
  }
  return [
    {
      code: 'interference',
      severity: 'fail',
      message: `The ${mate}'s tip reaches below the ${role}'s usable involute, by ${(gear.formReach - lowest).toFixed(3)} mm along the line of action. Shorten the ${mate}'s tips, give the ${role} more profile shift or use more ${role} teeth.`,
      value: lowest,
      limit: gear.formReach,
    },
  ];
}

function backlashFindings(mesh: MeshGeometry, module: number): Finding[] {
  const j = mesh.normalBacklash;
  if (j >= -JUDGING_SLACK * module) return [];
  return [
    {
      code: 'no-backlash',
      severity: 'fail',
      message: `The teeth jam: the normal backlash is ${j.toFixed(3).replace('-', '−')} mm. Without thinner teeth the shafts must be at least ${plain(mesh.zeroBacklashCentreDistance)} mm apart.`,
      value: j,
      limit: 0,
    },
  ];
}

function clearanceFindings(role: Role, mate: Role, clearance: number, module: number): Finding[] {
  const least = HOUSE_LIMITS.tipClearance * module;
  if (clearance >= least - JUDGING_SLACK * module) return [];
  const touches = clearance < -JUDGING_SLACK * module;
  return [
    {
      code: touches ? 'tip-hits-root' : 'tip-clearance-low',
      severity: touches ? 'fail' : 'marginal',
      message: touches
        ? `The ${role}'s tips run ${formatLength(-clearance)} into the ${mate}'s root. Shorten the ${role}'s tips or move the shafts apart.`
        : `The ${role}'s tips clear the ${mate}'s root by ${formatLength(clearance)}; the house rule asks for ${formatLength(least)}. Shorten the ${role}'s tips.`,
      value: clearance,
      limit: touches ? 0 : least,
    },
  ];
}

function tipFindings(role: Role, gear: ResolvedGear, figures: GearFigures, leastModules: number): Finding[] {
  const m = gear.module;
  const thickness = Math.min(figures.tipThickness, thicknessAt(gear, gear.effectiveShift, figures.tip));
  const least = leastModules * m;
  const hardened = HOUSE_LIMITS.tipThicknessCaseHardened * m;
  if (thickness < least - JUDGING_SLACK * m) {
    return [
      {
        code: 'tip-thin',
        severity: 'fail',
        message: `The ${role}'s teeth are ${formatLength(thickness)} thick at the tip; at least ${formatLength(least)} is required. Use less profile shift or shorten the tips.`,
        value: thickness,
        limit: least,
      },
    ];
  }
  if (thickness >= hardened - JUDGING_SLACK * m) return [];
  return [
    {
      code: 'tip-thin-for-hardening',
      severity: 'note',
      message: `The ${role}'s teeth are ${formatLength(thickness)} thick at the tip. Case-hardened teeth need ${formatLength(hardened)}.`,
      value: thickness,
      limit: hardened,
    },
  ];
}

function undercutFindings(role: Role, gear: ResolvedGear, figures: GearFigures): Finding[] {
  if (!figures.undercut) return [];
  return [
    {
      code: 'undercut',
      severity: 'note',
      message: `The ${role} is undercut: its ${gear.teeth} teeth need a profile shift of ${figures.leastShift.toFixed(4).replace('-', '−')} to be free of it and are cut at ${gear.effectiveShift.toFixed(4).replace('-', '−')}.`,
      value: gear.effectiveShift,
      limit: figures.leastShift,
    },
  ];
}
