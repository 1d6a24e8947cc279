import { Injectable } from '@nestjs/common';
import { type KitEdits } from '@stageyard/libs/bill-of-materials';
import { toPartRef } from '../../parts/part-ref.js';
import { toFitPart } from '../../substitutes/fit-part.js';
import { type BomEdits } from '../bom-edits.js';
import { StockGears } from '../stock-gears.service.js';

/** Looks up the parts that people chose and added. */
@Injectable()
export class KitEditsReader {
  constructor(private readonly stock: StockGears) {}

  /** What the kit rules need to know of the edits; one query. */
  async of({ swaps, extraLines }: BomEdits): Promise<KitEdits> {
    const numbers = [...Object.values(swaps), ...extraLines.flatMap(({ partNumber }) => partNumber ?? [])];
    const parts = await this.stock.byNumber(numbers);
    return {
      chosen: new Map(
        Object.entries(swaps).flatMap(([key, number]) => {
          const part = parts.get(number);
          return part ? [[key, { ref: toPartRef(part), fit: toFitPart(part) }] as const] : [];
        }),
      ),
      added: extraLines.map((line) => {
        const part = line.partNumber === null ? undefined : parts.get(line.partNumber);
        return { ...line, part: part ? toPartRef(part) : null };
      }),
    };
  }
}
