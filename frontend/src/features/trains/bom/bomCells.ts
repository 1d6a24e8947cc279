import type { BomLine } from '../../../api/types';
import { formatFixed, formatPlain } from '../../../components/figures';

/** Heads of the copied table. */
export const BOM_HEADS = [
  'Find',
  'Part number',
  'Description',
  'Quantity',
  'Unit',
  'Material',
  'Supply',
  'Supplier',
  'Mass kg each',
  'Used in',
  'Note',
  'Look at',
];

/** What stands where a number is missing. */
export function partNumberWords({ partNumber, supply }: Pick<BomLine, 'partNumber' | 'supply'>): string {
  return partNumber ?? (supply === 'made' ? 'to be made' : 'to be chosen');
}

/** One line as cells of the copied table. */
export function bomCells(line: BomLine): string[] {
  return [
    String(line.findNumber),
    partNumberWords(line),
    line.description,
    String(line.quantity),
    line.unit,
    line.material ?? '',
    line.supply,
    line.supplier ?? '',
    line.mass === null ? '' : String(Number(line.mass.toFixed(4))),
    line.source.join(', '),
    line.note,
    line.flags.join('; '),
  ];
}

/** `2 pcs`, `0.25 l`. */
export const quantityWords = ({ quantity, unit }: Pick<BomLine, 'quantity' | 'unit'>): string =>
  `${formatPlain(quantity, 3)} ${unit}`;

/** Three decimals, four for what is lighter than 10 g; a dash where it is not known. */
export const massWords = (kg: number | null): string =>
  formatFixed(kg, kg !== null && kg > 0 && kg < 0.01 ? 4 : 3);
