import { type INestApplicationContext } from '@nestjs/common';
import { PartsLoader } from '@stageyard/backend/parts/parts-loader.service';
import { PartsService } from '@stageyard/backend/parts/parts.service';
import { type Actors } from './actors.js';
import { demoLibrary, type LibraryRow } from './data/library.js';

/** A row of the demo library and the number it was booked under. */
export interface BookedPart {
  row: LibraryRow;
  number: string;
}

/** Books gears and other parts as the librarian; a withdrawn gear is booked cleared first, as in life. */
export async function bookLibrary(
  app: INestApplicationContext,
  { librarian }: Actors,
): Promise<BookedPart[]> {
  const rows = demoLibrary();
  const inputs = rows.map((row) => ({
    ...row,
    standing: row.standing === 'draft' ? ('draft' as const) : ('cleared' as const),
  }));
  const numbers = await app.get(PartsLoader).createMany(librarian, inputs);
  const booked = rows.map((row, index) => ({ row, number: numberAt(numbers, index) }));
  await withdraw(app.get(PartsService), librarian, booked);
  return booked;
}

function numberAt(numbers: readonly string[], index: number): string {
  const number = numbers[index];
  if (number === undefined) throw new Error(`The part at place ${index} got no number.`);
  return number;
}

async function withdraw(
  parts: PartsService,
  librarian: Actors['librarian'],
  booked: readonly BookedPart[],
): Promise<void> {
  for (const [index, { row, number }] of booked.entries()) {
    if (row.standing !== 'withdrawn') continue;
    // The gear with one tooth more of the same family takes over, where there is one.
    const next = booked[index + 1];
    const takesOver = next?.row.standing === 'cleared' && next.row.material === row.material;
    await parts.update(librarian, number, {
      version: 1,
      standing: 'withdrawn',
      ...(takesOver ? { successorNumber: next.number } : {}),
    });
  }
}
