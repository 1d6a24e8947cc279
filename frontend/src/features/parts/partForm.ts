import type { Part, PartInput, PartKind, PartPatch } from '../../api/types';
import { readDecimal } from '../../components/decimalText';
import { textOf } from '../../components/NumberField';
import { attributeOf } from './attributes';
import { ATTRIBUTES, type AttributeField } from './partKinds';

/** The part form holds text as typed; nothing is rewritten until it is sent. */
export interface PartForm {
  number: string;
  kind: PartKind;
  description: string;
  standing: 'draft' | 'cleared';
  material: string;
  mass: string;
  supply: 'made' | 'bought';
  supplier: string;
  note: string;
  /** Attribute name → typed text; every kind's fields, so that switching the kind and back loses nothing. */
  attr: Record<string, string>;
}

const ALL_FIELDS = Object.values(ATTRIBUTES).flat();

/** Every attribute field blank, or at its usual start. */
function startAttributes(): Record<string, string> {
  return Object.fromEntries(ALL_FIELDS.map((field) => [field.name, field.start ?? '']));
}

export function newPartForm(kind: PartKind): PartForm {
  return {
    number: '',
    kind,
    description: '',
    standing: 'draft',
    material: '',
    mass: '',
    supply: 'bought',
    supplier: '',
    note: '',
    attr: startAttributes(),
  };
}

export function formOfPart(part: Part): PartForm {
  const attr = startAttributes();
  for (const { name } of ATTRIBUTES[part.kind]) {
    const value = attributeOf(part, name);
    attr[name] = typeof value === 'number' ? textOf(value) : typeof value === 'string' ? value : '';
  }
  return {
    number: part.number,
    kind: part.kind,
    description: part.description,
    standing: part.standing === 'cleared' ? 'cleared' : 'draft',
    material: part.material ?? '',
    mass: textOf(part.mass),
    supply: part.supply,
    supplier: part.supplier ?? '',
    note: part.note,
    attr,
  };
}

const blankToNull = (text: string): string | null => (text.trim() === '' ? null : text.trim());

/** A typed figure as a number, blank as null; text that is no number goes as it is, for the server to refuse by name. */
function figureToSend(typed: string): number | string | null {
  const reading = readDecimal(typed);
  if (reading.kind === 'blank') return null;
  return reading.kind === 'number' ? reading.value : typed;
}

const isFigure = (field: AttributeField): boolean => field.type === 'figure' || field.unit === '°';

/** The attributes of the chosen kind only. */
export function attributesToSend(form: PartForm): Record<string, unknown> {
  return Object.fromEntries(
    ATTRIBUTES[form.kind].map((field) => {
      const typed = form.attr[field.name] ?? '';
      return [field.name, isFigure(field) ? figureToSend(typed) : blankToNull(typed)];
    }),
  );
}

function commonFields(form: PartForm) {
  return {
    description: form.description.trim(),
    material: blankToNull(form.material),
    mass: figureToSend(form.mass) as number | null,
    supply: form.supply,
    supplier: blankToNull(form.supplier),
    note: form.note,
    attributes: attributesToSend(form),
  };
}

export function inputOf(form: PartForm): PartInput {
  return {
    ...commonFields(form),
    number: blankToNull(form.number),
    kind: form.kind,
    standing: form.standing,
  } as PartInput;
}

export function patchOf(form: PartForm, version: number): PartPatch {
  return { ...commonFields(form), version } as PartPatch;
}

export type PartField = Exclude<keyof PartForm, 'attr'> | `attr.${string}`;

const PLAIN: readonly string[] = [
  'number',
  'kind',
  'description',
  'standing',
  'material',
  'mass',
  'supply',
  'supplier',
  'note',
];

/** Where the server's dotted path stands on this form. */
export function fieldOf(kind: PartKind, path: string): PartField | null {
  if (PLAIN.includes(path)) return path as PartField;
  const name = path.replace(/^attributes\./, '');
  return ATTRIBUTES[kind].some((field) => field.name === name) ? `attr.${name}` : null;
}
