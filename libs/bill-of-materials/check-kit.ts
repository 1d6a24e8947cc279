import { InputError, type FieldIssue } from '../units/index.js';
import { type KitGear, type KitRequest } from './kit.js';

const MOST_STAGES = 20;

/** @throws InputError listing every field that has no meaning, by its path in the request */
export function checkKit(request: KitRequest): void {
  const issues: FieldIssue[] = [];
  const positive = (field: string, value: number, most: number, unit: string) => {
    if (Number.isFinite(value) && value > 0 && value <= most) return;
    const message = `${field} must be above 0 and at most ${most.toLocaleString('en-GB')} ${unit}.`;
    issues.push({ field, value: String(value), limit: most, message });
  };
  request.shafts.forEach((shaft, i) => {
    positive(`shafts.${i}.diameter`, shaft.diameter, 1000, 'mm');
    positive(`shafts.${i}.length`, shaft.length, 10_000, 'mm');
  });
  request.gears.forEach((gear, i) => {
    positive(`gears.${i}.module`, gear.module, 100, 'mm');
    positive(`gears.${i}.faceWidth`, gear.faceWidth, 10_000, 'mm');
    issues.push(...gearIssues(gear, `gears.${i}`));
  });
  const { length, width, height, wall } = request.box;
  Object.entries({ length, width, height, wall }).forEach(([name, size]) => {
    positive(`box.${name}`, size, 100_000, 'mm');
  });
  if (Math.min(length, width, height) <= 2 * wall) {
    const message = `A wall of ${wall} mm leaves no inside in this box. Make the box larger or the wall thinner.`;
    issues.push({ field: 'box.wall', value: wall, message });
  }
  issues.push(...arrangementIssues(request));
  if (issues.length > 0) throw new InputError(issues);
}

function gearIssues(gear: KitGear, path: string): FieldIssue[] {
  const issues: FieldIssue[] = [];
  if (!Number.isInteger(gear.teeth) || gear.teeth < 4 || gear.teeth > 10_000) {
    const message = `${path}.teeth must be a whole number from 4 to 10,000.`;
    issues.push({ field: `${path}.teeth`, value: String(gear.teeth), limit: 4, message });
  }
  if (!(gear.helixAngleDeg >= 0 && gear.helixAngleDeg <= 45)) {
    const message = `${path}.helixAngleDeg must be from 0° to 45°.`;
    issues.push({ field: `${path}.helixAngleDeg`, value: String(gear.helixAngleDeg), limit: 45, message });
  }
  if (gear.role === 'wheel' && gear.mounting === 'integral') {
    const message = 'A wheel is keyed on its shaft; only a pinion can be cut on one.';
    issues.push({ field: `${path}.mounting`, value: gear.mounting, limit: 'keyed', message });
  }
  for (const field of ['profileShift', 'pressureAngleDeg'] as const) {
    if (Number.isFinite(gear[field])) continue;
    const message = `${path}.${field} must be a finite number.`;
    issues.push({ field: `${path}.${field}`, value: String(gear[field]), message });
  }
  return issues;
}

/** Stages 1 to n with one pinion and one wheel each, on shafts 0 to n. */
function arrangementIssues({ gears, shafts }: KitRequest): FieldIssue[] {
  const stages = shafts.length - 1;
  if (stages < 1 || stages > MOST_STAGES) {
    const message = `A train has two shafts or more, and at most ${MOST_STAGES + 1}.`;
    return [{ field: 'shafts', value: shafts.length, limit: MOST_STAGES + 1, message }];
  }
  const indexes = shafts.map((shaft) => shaft.index).sort((a, b) => a - b);
  if (indexes.some((index, i) => index !== i)) {
    const message = `Shafts are numbered 0 to ${stages} without a gap.`;
    return [{ field: 'shafts', value: indexes.join(', '), message }];
  }
  const complete = Array.from({ length: stages }, (_, i) => i + 1).every((stage) =>
    (['pinion', 'wheel'] as const).every(
      (role) => gears.filter((gear) => gear.stage === stage && gear.role === role).length === 1,
    ),
  );
  if (complete && gears.length === 2 * stages) return [];
  const message = `Each of the ${stages} stages needs one pinion and one wheel; ${gears.length} gears are given.`;
  return [{ field: 'gears', value: gears.length, limit: 2 * stages, message }];
}
