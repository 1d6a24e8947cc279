import { type BomLine, type KitItem } from './bom-line.js';
import { boxItems } from './box-lines.js';
import { checkKit } from './check-kit.js';
import { gearItems } from './gear-lines.js';
import { type KitRequest } from './kit.js';
import { mountGears } from './mounted-gear.js';
import { type PartFinder } from './part-finder.js';
import { rollUp } from './roll-up.js';
import { shaftItems } from './shaft-lines.js';

/**
 * The bill of materials of a train by the kit rules: gears from stock or made to order with their gear data; per shaft
 * the shaft, two bearings, a key (DIN 6885-1) and a retaining ring (DIN 471) per keyed gear and a ring at the locating
 * bearing; seals at input and output; housing; lubricant. What the library does not hold is listed and flagged.
 *
 * A pinion whose rim under the keyway, (d_f − bore)/2 − t2, would be thinner than two modules is cut on its shaft.
 * @param request the train; lengths mm, masses come out in kg
 * @param library asked once for each need
 * @returns lines by kind with find numbers (gears 101…, pinion shafts 201…, shafts 301… and so on)
 * @throws InputError naming every field that has no meaning
 */
export function buildBom(request: KitRequest, library: PartFinder): BomLine[] {
  return rollUp(kitItems(request, library));
}

/** The kit before roll-up. @throws InputError as `buildBom` */
export function kitItems(request: KitRequest, library: PartFinder): KitItem[] {
  checkKit(request);
  const mounted = mountGears(request, library);
  return [
    ...gearItems(mounted, request),
    ...shaftItems(request, mounted, library),
    ...boxItems(request, library),
  ];
}
