import { ValidationError } from 'class-validator';

/** The faults of an object that was checked by itself, as faults of the field that holds it. */
export function under(field: string, faults: ValidationError[]): ValidationError {
  const holder = new ValidationError();
  holder.property = field;
  holder.children = faults;
  return holder;
}
