import { type INestApplicationContext } from '@nestjs/common';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { type PartInputDto } from '../parts/dto/part-input.dto.js';
import { PartsLoader } from '../parts/parts-loader.service.js';
import { type TrainDto } from '../trains/dto/train.dto.js';
import { TrainsService } from '../trains/trains.service.js';
import { addOffer, addSupplier } from './add-offer.js';
import { newRequirement } from './new-brief.js';
import { LIBRARIAN, newPart } from './new-part.js';
import { newTrain } from './new-train.js';

/** A train whose bought parts are offered in three currencies, with the ids of some of the offers. */
export interface PricedTrain {
  train: TrainDto;
  /** For the bearing: cheap in numbers and old, and dear and quick. */
  tidewater: string;
  quick: string;
  /** For a key. */
  keys: string;
}

const cleared = (number: string, kind: PartInputDto['kind'], attributes: object): PartInputDto =>
  newPart(kind, attributes, { number, standing: 'cleared' });

/**
 * A single stage of module 2 on two shafts of 12 mm, to be built 25 times. One train takes four bearings `B-12`, two keys
 * `K-…`, two seals `W-12` and 0.2 l of `L-220`; the rest is made, or not in the library.
 */
export async function newPricedTrain(
  app: INestApplicationContext,
  actor: SignedInUser,
): Promise<PricedTrain> {
  await app
    .get(PartsLoader)
    .createMany(LIBRARIAN, [
      cleared('B-12', 'bearing', { bore: 12, outerDiameter: 28, width: 8, type: 'deep groove ball' }),
      ...[16, 18, 20].map((length) => cleared(`K-${length}`, 'key', { width: 4, height: 4, length })),
      cleared('W-12', 'seal', { shaftDiameter: 12, outerDiameter: 22, width: 6 }),
      cleared('L-220', 'lubricant', { viscosityGrade: 'ISO VG 220', packVolume: 5 }),
    ]);
  const offers = await addOffers(app);
  const requirement = newRequirement({
    ratio: { target: '4', tolerancePercent: '1' },
    stages: { min: 1, max: 1 },
    modules: [2],
    buildQuantity: 25,
  });
  const { code, version } = await newTrain(app, actor, { requirement });
  const train = await app.get(TrainsService).edit(code, { version, shaftDiameters: [12, 12] }, actor);
  return { train, ...offers };
}

async function addOffers(app: INestApplicationContext): Promise<Omit<PricedTrain, 'train'>> {
  const { code: first } = await addSupplier(app, { name: 'Tidewater Bearings', leadTimeDays: 21 });
  const { code: second } = await addSupplier(app, { name: 'Quickhaven', leadTimeDays: null });
  const { code: third } = await addSupplier(app, { name: 'Shiomi Seals', currency: 'JPY' });
  const { code: fourth } = await addSupplier(app, {
    name: 'Pearl Oils',
    currency: 'KWD',
    leadTimeDays: null,
  });
  // 4.20 EUR from 1, 3.10 from 50, 2.55 from 1,000; sold in tens.
  const tidewater = await addOffer(app, 'B-12', first, {
    breaks: [
      { quantity: 1, unitPrice: 420 },
      { quantity: 50, unitPrice: 310 },
      { quantity: 1000, unitPrice: 255 },
    ],
    pack: 10,
    supplierPartNumber: 'TW 12/28',
    pricedOn: '2020-02-03',
  });
  const quick = await addOffer(app, 'B-12', second, {
    breaks: [{ quantity: 1, unitPrice: 515 }],
    leadTimeDays: 2,
  });
  // 9.50 EUR for 100 keys, sold by the hundred. The hub decides which of the lengths the train takes.
  let keys = '';
  for (const number of ['K-16', 'K-18', 'K-20']) {
    const breaks = [{ quantity: 100, unitPrice: 950 }];
    keys = (await addOffer(app, number, first, { breaks, per: 100, pack: 100 })).id;
  }
  // 180 JPY from 1, 150 JPY from 40.
  await addOffer(app, 'W-12', third, {
    breaks: [
      { quantity: 1, unitPrice: 180 },
      { quantity: 40, unitPrice: 150 },
    ],
    leadTimeDays: 40,
  });
  // 12.345 KWD for ten litres, sold in cans of five.
  await addOffer(app, 'L-220', fourth, { breaks: [{ quantity: 5, unitPrice: 12_345 }], per: 10, pack: 5 });
  return { tidewater: tidewater.id, quick: quick.id, keys };
}
