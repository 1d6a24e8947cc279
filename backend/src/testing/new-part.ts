import { type PartInputDto } from '../parts/dto/part-input.dto.js';

/** A person for tests that change things. */
export const LIBRARIAN = { id: 'librarian', name: 'Lena Brook' };

/** A good spur gear; name only what the test is about. Attributes are merged. */
export function newGear(
  changes: Partial<Omit<PartInputDto, 'attributes'>> & { attributes?: object } = {},
): PartInputDto {
  return {
    kind: 'gear',
    description: 'Spur gear m 2, 24 teeth',
    material: 'C45',
    mass: 0.28,
    supply: 'bought',
    ...changes,
    attributes: { teeth: 24, module: 2, faceWidth: 20, bore: 12, ...changes.attributes },
  };
}

/** A good part of any other kind. */
export function newPart(
  kind: PartInputDto['kind'],
  attributes: object,
  changes: Partial<PartInputDto> = {},
): PartInputDto {
  return { kind, description: `A ${kind}`, supply: 'bought', ...changes, attributes };
}
