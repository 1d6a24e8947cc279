import { type BomLine } from '@stageyard/libs/bill-of-materials';

/** What all trains built at once need of a line; thousandths of the unit do not grow a tail. */
export function lineQuantity({ quantity }: Pick<BomLine, 'quantity'>, builds: number): number {
  return Math.round(quantity * 1000 * builds) / 1000;
}
