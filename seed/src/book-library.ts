import { type INestApplicationContext } from '@nestjs/common';
import { PartsLoader } from '@stageyard/backend/parts/parts-loader.service';
import { PartsService } from '@stageyard/backend/parts/parts.service';
import { type Actors } from './actors.js';
import { demoGears, type GearRow } from './data/gears.js';
import { demoOtherParts } from './data/other-parts.js';

/** Books gears and other parts as the librarian; a withdrawn gear is booked cleared first, as in life. */
export async function bookLibrary(app: INestApplicationContext, { librarian }: Actors): Promise<number> {
  const gears = demoGears();
  const rows = [...gears, ...demoOtherParts()];
  const inputs = rows.map((row) => ({
    ...row,
    standing: row.standing === 'draft' ? ('draft' as const) : ('cleared' as const),
  }));
  const numbers = await app.get(PartsLoader).createMany(librarian, inputs);
  await withdraw(app.get(PartsService), librarian, gears, numbers);
  return numbers.length;
}

async function withdraw(
  parts: PartsService,
  librarian: Actors['librarian'],
  gears: GearRow[],
  numbers: string[],
): Promise<void> {
  for (const [index, gear] of gears.entries()) {
    const number = numbers[index];
    if (gear.standing !== 'withdrawn' || number === undefined) continue;
    // The gear with one tooth more of the same family takes over, where there is one.
    const next = gears[index + 1];
    const successor =
      next?.standing === 'cleared' && next.material === gear.material ? numbers[index + 1] : undefined;
    await parts.update(librarian, number, {
      version: 1,
      standing: 'withdrawn',
      ...(successor === undefined ? {} : { successorNumber: successor }),
    });
  }
}
