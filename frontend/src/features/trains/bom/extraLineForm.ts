import type { ExtraLine, ExtraLineInput } from '../../../api/types';
import { readDecimal } from '../../../components/decimalText';
import { numberProblem } from '../../../components/NumberField';

/** An added line as it stands in the form: every field is the text that was typed. */
export interface ExtraLineForm {
  partNumber: string;
  description: string;
  quantity: string;
  unit: string;
  note: string;
}

/** Greatest quantity of an added line, as the server keeps it. */
const MOST = 1_000_000;

export function formOfLine(line: ExtraLine | null): ExtraLineForm {
  if (line === null) return { partNumber: '', description: '', quantity: '1', unit: 'pcs', note: '' };
  const { partNumber, description, quantity, unit, note } = line;
  return { partNumber: partNumber ?? '', description, quantity: String(quantity), unit, note };
}

export interface LineReading {
  /** Null while something is wrong. */
  line: ExtraLineInput | null;
  wrong: Partial<Record<keyof ExtraLineForm, string>>;
}

/** The typed text as a line for the server, or what is wrong with it, field by field. */
export function lineOfForm(form: ExtraLineForm, id: string | null): LineReading {
  const wrong: LineReading['wrong'] = {};
  const quantity = readDecimal(form.quantity);
  const limits = { required: true, min: 0, above: true, max: MOST, whole: form.unit === 'pcs' };
  const problem = numberProblem(form.quantity, limits);
  if (problem !== null) wrong.quantity = problem;
  const [partNumber, description] = [form.partNumber.trim(), form.description.trim()];
  if (partNumber === '' && description === '') wrong.description = 'Say what it is, or name a part.';
  if (Object.keys(wrong).length > 0 || quantity.kind !== 'number') return { line: null, wrong };
  const unit = form.unit as ExtraLine['unit'];
  const line = {
    ...(id === null ? {} : { id }),
    partNumber: partNumber === '' ? null : partNumber,
    description,
    quantity: quantity.value,
    unit,
    note: form.note.trim(),
  };
  return { line, wrong: {} };
}
