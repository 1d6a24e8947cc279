import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsBoolean, IsObject, ValidateIf, ValidateNested } from 'class-validator';
import { FieldPastedText } from '../../../common/field-pasted-text.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';
import { OfferPasteDefaultsDto } from './offer-paste-defaults.dto.js';

/** Rows of a supplier's price list as a spreadsheet copies them. */
@ApiSchema({ name: 'OfferPasteInput' })
export class OfferPasteInputDto {
  @FieldPastedText(
    'Tab-separated rows: part number, supplier part number, from quantity, price, currency, per, pack, least ' +
      'quantity, lead time, valid from, valid until, priced on, source, note; a head row may name the columns in ' +
      'any order, and several columns such as “Price from 10” give the price breaks',
  )
  text!: string;

  @FieldText({ description: 'Code of the supplier', min: 1, max: 20, example: 'S-0001' })
  supplierCode!: string;

  @ApiProperty({ type: OfferPasteDefaultsDto, required: false, description: 'For rows that do not say it' })
  @ValidateIf((_, value) => value !== undefined)
  @IsObject()
  @ValidateNested()
  @Type(() => OfferPasteDefaultsDto)
  defaults?: OfferPasteDefaultsDto;
}

/** The pasted rows once more, with what the preview answered. */
@ApiSchema({ name: 'OfferPasteBookInput' })
export class OfferPasteBookInputDto extends OfferPasteInputDto {
  @FieldText({ description: 'From the preview', min: 1, max: 100 })
  token!: string;

  @ApiProperty({ type: 'boolean', description: 'Books the rest; otherwise one wrong row refuses them all' })
  @IsBoolean({ message: 'leaveOutWrong must be true or false.' })
  leaveOutWrong!: boolean;
}
