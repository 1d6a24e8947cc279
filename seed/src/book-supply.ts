import { type INestApplicationContext } from '@nestjs/common';
import { OffersLoader } from '@stageyard/backend/offers/offers-loader';
import { SuppliersService } from '@stageyard/backend/suppliers/suppliers.service';
import { type Actors } from './actors.js';
import { type BookedPart } from './book-library.js';
import { offersOf } from './data/offers.js';
import { DEMO_SUPPLIERS } from './data/suppliers.js';

/**
 * Books suppliers and their offers as the purchaser.
 * @param today ISO 8601 date that the days of the offers are counted back from
 */
export async function bookSupply(
  app: INestApplicationContext,
  { purchaser }: Actors,
  parts: readonly BookedPart[],
  today: string,
): Promise<{ suppliers: number; offers: number }> {
  const codes = new Map<string, string>();
  for (const supplier of DEMO_SUPPLIERS) {
    const { code } = await app.get(SuppliersService).create(purchaser, supplier);
    codes.set(supplier.name, code);
  }
  const inputs = parts.flatMap(({ row, number }, index) =>
    offersOf(row, index, today).map(({ supplier, ...terms }) => ({
      ...terms,
      partNumber: number,
      supplierCode: codeOf(codes, supplier),
    })),
  );
  const ids = await app.get(OffersLoader).createMany(purchaser, inputs);
  return { suppliers: codes.size, offers: ids.length };
}

function codeOf(codes: ReadonlyMap<string, string>, name: string): string {
  const code = codes.get(name);
  if (code === undefined) throw new Error(`“${name}” offers parts but is no demo supplier.`);
  return code;
}
