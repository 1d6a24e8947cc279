import { type FieldIssue } from '@stageyard/libs/units';
import { badInput } from '../common/errors.js';
import { type Part } from '../parts/entities/part.entity.js';
import { type AdoptedSpec, gearsOf, gearsOnShaft } from './adopted-spec.js';
import { type TrainPatchDto } from './dto/train-patch.dto.js';
import { refusePart } from './gear-choice.js';
import { rootLimit, SHAFT_BOUNDS } from './shaft-diameters.js';

/**
 * The specification with the choices of a patch; the given one is left as it is.
 * @param parts the parts that the patch names, by number
 * @throws ProblemError 400 naming every choice that cannot be
 */
export function patchSpec(
  spec: AdoptedSpec,
  patch: Pick<TrainPatchDto, 'stages' | 'shaftDiameters'>,
  parts: ReadonlyMap<string, Part>,
): AdoptedSpec {
  const changed = structuredClone(spec);
  const issues = [
    ...lengthIssue('stages', patch.stages, spec.stages.length, 'stage'),
    ...lengthIssue('shaftDiameters', patch.shaftDiameters, spec.shafts.length, 'shaft'),
  ];
  if (issues.length === 0) {
    issues.push(...chooseHands(changed, patch));
    issues.push(...chooseParts(changed, patch, parts));
    issues.push(...typeDiameters(changed, patch.shaftDiameters ?? []));
  }
  if (issues.length > 0) throw badInput(issues);
  return changed;
}

function lengthIssue(field: string, list: unknown[] | undefined, limit: number, what: string): FieldIssue[] {
  if (list === undefined || list.length === limit) return [];
  const message = `${field} has ${list.length} entries; the train has ${limit} ${what}s. Give one for each.`;
  return [{ field, value: list.length, limit, message }];
}

function chooseHands(spec: AdoptedSpec, patch: Pick<TrainPatchDto, 'stages'>): FieldIssue[] {
  return gearsOf(spec).flatMap(({ gear, stage, role }): FieldIssue[] => {
    const hand = patch.stages?.[stage]?.[role]?.hand;
    if (hand === undefined || hand === gear.hand) return [];
    const field = `stages.${stage}.${role}.hand`;
    if (spec.helixAngleDeg === 0) {
      return [{ field, value: hand, message: 'A spur gear has no hand. Leave it out.' }];
    }
    const mate = role === 'pinion' ? 'wheel' : 'pinion';
    const mateHand = patch.stages?.[stage]?.[mate]?.hand ?? spec.stages[stage]?.[mate].hand;
    if (mateHand === hand) {
      const message = `The pinion and the wheel of stage ${stage + 1} would both be ${hand}-handed. They must be opposite: change both.`;
      return [{ field, value: hand, limit: hand === 'left' ? 'right' : 'left', message }];
    }
    gear.hand = hand;
    return [];
  });
}

function chooseParts(
  spec: AdoptedSpec,
  patch: Pick<TrainPatchDto, 'stages'>,
  parts: ReadonlyMap<string, Part>,
): FieldIssue[] {
  return gearsOf(spec).flatMap((placed): FieldIssue[] => {
    const { gear, stage, role } = placed;
    const choice = patch.stages?.[stage]?.[role];
    if (!choice) return [];
    // A stock gear does not change its hand: a new hand without a new part means made to order.
    const unnamed = choice.partNumber === undefined;
    if (unnamed && choice.hand === undefined) return [];
    const number = unnamed ? gear.partNumber : choice.partNumber || null;
    const issue =
      number !== null &&
      refusePart(`stages.${stage}.${role}.partNumber`, number, parts.get(number), spec, placed);
    if (issue && !unnamed) return [issue];
    gear.partNumber = issue || number === null ? null : (parts.get(number)?.number ?? number);
    return [];
  });
}

function typeDiameters(spec: AdoptedSpec, diameters: readonly unknown[]): FieldIssue[] {
  return diameters.flatMap((diameter, index): FieldIssue[] => {
    const shaft = spec.shafts[index];
    if (diameter === null || !shaft || diameter === shaft.diameter) return [];
    const field = `shaftDiameters.${index}`;
    const { least, greatest } = SHAFT_BOUNDS;
    if (typeof diameter !== 'number' || diameter < least || diameter > greatest) {
      const message = `The diameter of shaft ${index} must be a number from ${least} to ${greatest} mm.`;
      const limit = typeof diameter === 'number' && diameter > greatest ? greatest : least;
      return [{ field, value: diameter, limit, message }];
    }
    const room = Math.min(...gearsOnShaft(spec, index).map((placed) => rootLimit(spec, placed)));
    if (diameter > room) {
      const message = `Shaft ${index} cannot be ${diameter} mm: inside the teeth of its smaller gear there is room for ${room} mm.`;
      return [{ field, value: diameter, limit: room, message }];
    }
    spec.shafts[index] = { diameter, basis: 'typed' };
    return [];
  });
}
