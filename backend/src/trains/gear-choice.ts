import { type FieldIssue } from '@stageyard/libs/units';
import { type Part } from '../parts/entities/part.entity.js';
import { type AdoptedSpec, type PlacedGear, placeName } from './adopted-spec.js';

const SAME = 1e-6;

/**
 * Why a part cannot be a gear of the train; null when it can. It must be a cleared gear with the very same data and
 * at least the face width asked for.
 * @param field dotted path of the choice in the request
 */
export function refusePart(
  field: string,
  number: string,
  part: Part | undefined,
  spec: Pick<AdoptedSpec, 'pressureAngleDeg' | 'helixAngleDeg'>,
  placed: PlacedGear,
): FieldIssue | null {
  const refuse = (message: string, limit?: string | number): FieldIssue => ({
    field,
    value: number,
    ...(limit === undefined ? {} : { limit }),
    message,
  });
  if (!part)
    return refuse(`There is no part “${number.slice(0, 60)}”. Check the number, or look it up in Parts.`);
  if (part.standing !== 'cleared')
    return refuse(`${number} is ${part.standing}. Choose a cleared part.`, 'cleared');
  if (part.kind !== 'gear' && part.kind !== 'pinion-shaft') {
    return refuse(`${number} is a ${part.kind}, not a gear. Choose a gear.`, 'gear');
  }
  const { gear, module } = placed;
  const place = placeName(placed).toLowerCase();
  const wanted: [name: string, has: number | null, needs: number, unit: string][] = [
    ['teeth', part.teeth, gear.teeth, ''],
    ['module', part.module, module, ' mm'],
    ['pressure angle', part.pressureAngleDeg, spec.pressureAngleDeg, '°'],
    ['helix angle', part.helixAngleDeg, spec.helixAngleDeg, '°'],
    ['profile shift', part.profileShift ?? 0, gear.profileShift, ''],
  ];
  for (const [name, has, needs, unit] of wanted) {
    if (has !== null && Math.abs(has - needs) <= SAME) continue;
    const shown = has === null ? 'unknown' : `${has}${unit}`;
    return refuse(
      `${number}: ${name} ${shown}; the ${place} has ${needs}${unit}. Choose a gear that agrees.`,
      needs,
    );
  }
  if (spec.helixAngleDeg > 0 && gear.hand && part.hand !== gear.hand) {
    return refuse(
      `${number} is ${part.hand ?? 'of unknown hand'}; the ${place} is ${gear.hand}-handed.`,
      gear.hand,
    );
  }
  if (part.faceWidth === null || part.faceWidth < gear.faceWidth - SAME) {
    const has = part.faceWidth === null ? 'an unknown face width' : `a face width of ${part.faceWidth} mm`;
    return refuse(`${number} has ${has}; the ${place} needs ${gear.faceWidth} mm.`, gear.faceWidth);
  }
  return null;
}
