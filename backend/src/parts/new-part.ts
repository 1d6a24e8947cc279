import { type PartAttributes } from './dto/attributes/part-attributes.js';
import { type PartInputDto } from './dto/part-input.dto.js';
import { type Part } from './entities/part.entity.js';
import { indexColumns } from './part-columns.js';

/** What a new part is apart from its id, its number and who adds it when. */
export type NewPart = Omit<Part, 'id' | 'number' | 'createdAt' | 'updatedAt' | 'updatedBy'>;

/** A checked input with every default filled in; the attributes must come from `checkAttributes`. */
export function newPart(input: PartInputDto, attributes: PartAttributes): NewPart {
  return {
    kind: input.kind,
    description: input.description,
    standing: input.standing ?? 'draft',
    successorNumber: null,
    material: input.material || null,
    mass: input.mass ?? null,
    supply: input.supply ?? 'bought',
    supplier: input.supplier || null,
    note: input.note ?? '',
    attributes,
    ...indexColumns(input.kind, attributes),
    leastStock: null,
    version: 1,
  };
}
