import { ApiSchema } from '@nestjs/swagger';
import { IsEmail, ValidateIf } from 'class-validator';
import { FieldText } from '../../common/field-text.decorator.js';
import { type SupplierContact } from '../supplier-terms.js';

/** Somebody to send an enquiry to. */
@ApiSchema({ name: 'SupplierContact' })
export class SupplierContactDto implements SupplierContact {
  @FieldText({ description: 'Name', min: 1, max: 120 })
  name!: string;

  @FieldText({ description: 'What the person does there', max: 120, example: 'Sales' })
  role!: string;

  @FieldText({ description: 'E-mail address; blank when it is not known', max: 254 })
  @ValidateIf((_, value) => value !== '')
  @IsEmail()
  email!: string;

  @FieldText({ description: 'Telephone', max: 60 })
  phone!: string;
}
