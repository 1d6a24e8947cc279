import { ApiExtraModels, ApiProperty, ApiSchema, refs } from '@nestjs/swagger';
import { IsObject, ValidateIf } from 'class-validator';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import { PART_STANDINGS, PART_SUPPLIES, type PartStanding, type PartSupply } from '../part-kinds.js';
import { FieldPartNumber } from '../part-number.js';
import { ATTRIBUTE_CLASSES } from './attributes/part-attributes.js';

/** A change to a part: the version that was seen, and the fields that change. Number and kind stay for good. */
@ApiSchema({ name: 'PartPatch' })
@ApiExtraModels(...ATTRIBUTE_CLASSES)
export class PartPatchDto {
  @FieldFigure({
    description: 'Version that was seen before the edit',
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;

  @FieldText({ description: 'Description', min: 1, max: 200, optional: true })
  description?: string;

  @FieldChoice({
    description: 'Standing: draft → cleared → withdrawn; a withdrawn part may be cleared again',
    values: PART_STANDINGS,
    optional: true,
    enumName: 'PartStanding',
  })
  standing?: PartStanding;

  @FieldPartNumber({
    description: 'Part to use instead of this withdrawn one; null for none',
    optional: true,
  })
  successorNumber?: string | null;

  @FieldText({ description: 'Material', max: 100, nullable: true })
  material?: string | null;

  @FieldFigure({
    description: 'Mass of one',
    unit: 'kg',
    min: 0,
    above: true,
    max: 1_000_000,
    nullable: true,
  })
  mass?: number | null;

  @FieldChoice({
    description: 'Made by us or bought',
    values: PART_SUPPLIES,
    optional: true,
    enumName: 'PartSupply',
  })
  supply?: PartSupply;

  @FieldText({ description: 'Supplier', max: 200, nullable: true })
  supplier?: string | null;

  @FieldText({ description: 'Note', max: 10_000, multiline: true, optional: true })
  note?: string;

  @ApiProperty({
    description: 'All attributes of the kind, in place of the old ones',
    anyOf: refs(...ATTRIBUTE_CLASSES),
    required: false,
  })
  @ValidateIf((_, value) => value !== undefined)
  @IsObject({ message: 'attributes must be an object with the attributes of the kind.' })
  attributes?: object;
}
