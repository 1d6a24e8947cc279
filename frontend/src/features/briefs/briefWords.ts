import { formatTrimmed } from '@stageyard/libs/units';
import type { Requirement } from '../../api/types';
import { readDecimal } from '../../components/decimalText';
import { formatCount } from '../../components/figures';

/** The brief in one line: `37.5 : 1 ± 1 % · 45 N·m out · 1,400 rpm in · inside 220 × 180 × 90 mm · …`. */
export function briefWords(requirement: Requirement): string[] {
  const { ratio, duty, stages, direction, helixAngleDeg } = requirement;
  const parts = [`${ratio.target} : 1 ± ${ratio.tolerancePercent} %`];
  parts.push(
    stages.min === stages.max
      ? `${stages.min} ${stages.min === 1 ? 'stage' : 'stages'}`
      : `${stages.min}–${stages.max} stages`,
  );
  if (duty?.outputTorque !== undefined) parts.push(`${formatTrimmed(duty.outputTorque, 2)} N·m out`);
  if (duty?.inputSpeed !== undefined) parts.push(`${formatCount(duty.inputSpeed)} rpm in`);
  const inside = insideWords(requirement.envelope);
  if (inside !== null) parts.push(inside);
  parts.push(contactWords(requirement));
  if (helixAngleDeg) parts.push(`helix ${formatTrimmed(helixAngleDeg, 3)}°`);
  if (direction === 'same') parts.push('output with the input');
  if (direction === 'opposite') parts.push('output against the input');
  if (requirement.buildQuantity !== undefined)
    parts.push(`${formatCount(requirement.buildQuantity)} to build`);
  return parts;
}

function insideWords(envelope: Requirement['envelope']): string | null {
  if (!envelope) return null;
  const sides = [envelope.length, envelope.width, envelope.height] as (number | undefined)[];
  if (sides.every((side) => side === undefined)) return null;
  return `inside ${sides.map((side) => (side === undefined ? 'any' : formatTrimmed(side, 2))).join(' × ')} mm`;
}

function contactWords({ leastContactRatio = 1.2, centreDistanceAllowance = 0 }: Requirement): string {
  const least = `contact at least ${formatTrimmed(leastContactRatio, 3)}`;
  return centreDistanceAllowance === 0 ? least : `${least}, worst case`;
}

interface DutyText {
  inputSpeed: string;
  outputTorque: string;
  ratioTarget: string;
}

/** `37.3 rpm at the output; 45 N·m there is 0.176 kW.` as far as the figures are there; null when they are not. */
export function dutyWords({ inputSpeed, outputTorque, ratioTarget }: DutyText): string | null {
  const [speed, torque, ratio] = [inputSpeed, outputTorque, ratioTarget].map((text) => {
    const reading = readDecimal(text);
    return reading.kind === 'number' && reading.value > 0 ? reading.value : null;
  });
  if (speed == null || ratio == null) return null;
  const outputSpeed = speed / ratio;
  const said = `${formatTrimmed(outputSpeed, 1)} rpm at the output`;
  if (torque == null) return `${said}.`;
  // P = T ω
  const kilowatts = (torque * outputSpeed * 2 * Math.PI) / 60_000;
  return `${said}; ${formatTrimmed(torque, 2)} N·m there is ${formatTrimmed(kilowatts, 3)} kW.`;
}
