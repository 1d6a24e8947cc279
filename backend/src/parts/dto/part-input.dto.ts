import { ApiExtraModels, ApiProperty, ApiSchema, refs } from '@nestjs/swagger';
import { IsObject } from 'class-validator';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import { PART_KINDS, PART_SUPPLIES, type PartKind, type PartSupply } from '../part-kinds.js';
import { FieldPartNumber } from '../part-number.js';
import { ATTRIBUTE_CLASSES } from './attributes/part-attributes.js';

/** Standings a new part may start with: it cannot be withdrawn before it was ever there. */
const FIRST_STANDINGS = ['draft', 'cleared'] as const;

/** A new part. */
@ApiSchema({ name: 'PartInput' })
@ApiExtraModels(...ATTRIBUTE_CLASSES)
export class PartInputDto {
  @FieldPartNumber({ description: 'Part number; blank or null for the next running number', optional: true })
  number?: string | null;

  @FieldChoice({ description: 'Kind; it decides the attributes', values: PART_KINDS, enumName: 'PartKind' })
  kind!: PartKind;

  @FieldText({ description: 'Description', min: 1, max: 200, example: 'Spur gear m 2, 24 teeth' })
  description!: string;

  @FieldChoice({
    description: 'Standing at the start; draft when left out',
    values: FIRST_STANDINGS,
    optional: true,
    default: 'draft',
  })
  standing?: (typeof FIRST_STANDINGS)[number];

  @FieldText({ description: 'Material', max: 100, nullable: true, example: 'C45' })
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
    description: 'Made by us or bought; bought when left out',
    values: PART_SUPPLIES,
    optional: true,
    default: 'bought',
    enumName: 'PartSupply',
  })
  supply?: PartSupply;

  @FieldText({ description: 'Supplier', max: 200, nullable: true })
  supplier?: string | null;

  @FieldText({ description: 'Note', max: 10_000, multiline: true, optional: true })
  note?: string;

  @ApiProperty({
    description: 'The attributes of this kind, all of them checked',
    anyOf: refs(...ATTRIBUTE_CLASSES),
  })
  @IsObject({ message: 'attributes must be an object with the attributes of the kind.' })
  attributes!: object;
}
