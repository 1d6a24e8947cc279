import { gearGeometry, type GearGeometry, type GearInput } from '@stageyard/libs/gear-geometry';
import { DomainError } from '@stageyard/libs/units';
import { numberOrNull } from '../../components/NumberField';

/** What the typed figures come to, computed in the browser as they change. */
export type LiveGeometry =
  | { kind: 'waiting'; missing: string[] }
  | { kind: 'refused'; messages: string[] }
  | { kind: 'computed'; gear: GearInput; geometry: GearGeometry };

const NEEDED = { teeth: 'teeth', module: 'module' } as const;

/** Reads the attribute texts of a toothed part. A profile shift left blank counts as 0. */
export function liveGeometry(attr: Record<string, string>): LiveGeometry {
  const figure = (name: string) => numberOrNull(attr[name]);
  const [teeth, module] = [figure('teeth'), figure('module')];
  if (teeth === null || module === null) {
    const missing = (['teeth', 'module'] as const).filter((name) => figure(name) === null);
    return { kind: 'waiting', missing: missing.map((name) => NEEDED[name]) };
  }
  const upper = figure('thicknessAllowanceUpper');
  const lower = figure('thicknessAllowanceLower');
  const faceWidth = figure('faceWidth');
  const hand = attr['hand'];
  const gear: GearInput = {
    teeth,
    module,
    pressureAngleDeg: figure('pressureAngleDeg') ?? 20,
    helixAngleDeg: figure('helixAngleDeg') ?? 0,
    profileShift: figure('profileShift') ?? 0,
    ...(hand === 'left' || hand === 'right' ? { hand } : {}),
    ...(faceWidth === null ? {} : { faceWidth }),
    ...(upper === null && lower === null
      ? {}
      : { thicknessAllowance: { upper: upper ?? lower ?? 0, lower: lower ?? upper ?? 0 } }),
  };
  try {
    return { kind: 'computed', gear, geometry: gearGeometry(gear) };
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    const messages = error.errors.map(({ message }) => message);
    return { kind: 'refused', messages: messages.length > 0 ? messages : [error.message] };
  }
}
