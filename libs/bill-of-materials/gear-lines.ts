import { formatTrimmed } from '../units/index.js';
import { type KitItem } from './bom-line.js';
import { FLAG } from './flags.js';
import { type KitGear, type KitRequest } from './kit.js';
import {
  gearMass,
  leastRim,
  partGear,
  rimUnderKeyway,
  rootDiameter,
  shaftMass,
  type MountedGear,
} from './mounted-gear.js';
import { kitItem } from './part-lines.js';
import { dataOf, mateOf } from './train-gear-data.js';

/** One item per gear; a pinion cut on its shaft is one item for both. */
export function gearItems(mounted: readonly MountedGear[], request: KitRequest): KitItem[] {
  return mounted.map((own) => gearItem(own, mateOf(own, mounted), request));
}

function gearItem(own: MountedGear, mate: MountedGear | undefined, request: KitRequest): KitItem {
  const { gear, shaft, part, bore } = own;
  const onShaft = bore === null;
  const item = kitItem(
    {
      kind: onShaft ? 'pinion-shaft' : 'gear',
      wanted: gear.partNumber ?? null,
      description: describeGear(own),
      quantity: 1,
      material: gear.material ?? null,
      supply: 'made',
      // A bore as large as the gear leaves nothing to weigh; the flags say so.
      mass: onShaft ? gearMass(gear, shaft.diameter) + shaftMass(shaft) : gearMass(gear, bore) || null,
      source: onShaft ? `${own.source}, shaft ${shaft.index}` : own.source,
      note: onShaft ? `Cut on shaft ${shaft.index}; seats and shaft ends as drawn.` : '',
      flags: [...stockFlags(own), ...fitFlags(own), ...handFlags(own, mate)],
      need: own.need,
    },
    part,
  );
  return part ? item : { ...item, gearData: dataOf(own, mate, request) };
}

/** `Spur gear z 16, m 1.25, 20°, x 0.3, face 12 mm, bore 15 mm`. */
function describeGear({ gear, shaft, bore }: MountedGear): string {
  const helix =
    gear.helixAngleDeg === 0 ? '' : `, β ${formatTrimmed(gear.helixAngleDeg, 4)}° ${gear.hand ?? ''}`;
  const seat =
    bore === null
      ? `, on shaft Ø${formatTrimmed(shaft.diameter, 3)} × ${formatTrimmed(shaft.length, 2)} mm`
      : `, bore ${formatTrimmed(bore, 3)} mm`;
  const name = bore === null ? 'pinion shaft' : 'gear';
  return (
    `${gear.helixAngleDeg === 0 ? 'Spur' : 'Helical'} ${name} z ${gear.teeth}, m ${formatTrimmed(gear.module, 4)}, ` +
    `${formatTrimmed(gear.pressureAngleDeg, 2)}°${helix.trimEnd()}, x ${formatTrimmed(gear.profileShift, 4)}, ` +
    `face ${formatTrimmed(gear.faceWidth, 2)} mm${seat}`
  );
}

/** What the stock part leaves open, and where it is not what the design counts with. */
function stockFlags(own: MountedGear): string[] {
  const stock = partGear(own);
  if (!stock) return [];
  const { gear } = own;
  const flags: string[] = [];
  if (stock.profileShift === null) flags.push(FLAG.shiftUnknown);
  if (stock.thicknessAllowance === null) flags.push(FLAG.allowanceUnknown);
  const differs = (name: string, design: number, held: number) => {
    if (Math.abs(design - held) < 1e-9) return;
    flags.push(`${name} ${formatTrimmed(held, 4)} in stock, ${formatTrimmed(design, 4)} in the design`);
  };
  differs('teeth', gear.teeth, stock.teeth);
  differs('module', gear.module, stock.module);
  differs('pressure angle', gear.pressureAngleDeg, stock.pressureAngleDeg);
  differs('helix angle', gear.helixAngleDeg, stock.helixAngleDeg);
  differs('shift x', gear.profileShift, stock.profileShift ?? 0);
  if (stock.faceWidth < gear.faceWidth - 1e-9) differs('face width', gear.faceWidth, stock.faceWidth);
  if (stock.hand && gear.hand && gear.helixAngleDeg !== 0 && stock.hand !== gear.hand) {
    flags.push(`${stock.hand} hand in stock, ${gear.hand} in the design`);
  }
  return flags;
}

function fitFlags(own: MountedGear): string[] {
  const { gear, shaft, bore } = own;
  const root = rootDiameter(gear);
  if (bore === null) {
    return shaft.diameter > root ? [`shaft thicker than the root circle, ${formatTrimmed(root, 2)} mm`] : [];
  }
  const flags: string[] = [];
  const stockBore = partGear(own)?.bore ?? null;
  const [held, seat] = [formatTrimmed(stockBore, 3), formatTrimmed(shaft.diameter, 3)];
  if (stockBore !== null && stockBore < shaft.diameter) flags.push(`bore ${held} mm, bore out to ${seat} mm`);
  if (stockBore !== null && stockBore > shaft.diameter) {
    flags.push(`bore ${held} mm, shaft ${seat} mm: step the seat up`);
  }
  if (bore >= root) {
    const circle = formatTrimmed(root, 2);
    flags.push(`bore ${formatTrimmed(bore, 3)} mm does not fit inside the root circle, ${circle} mm`);
  } else if (rimUnderKeyway(gear, bore) < leastRim(gear)) flags.push(FLAG.thinRim);
  return flags;
}

function handFlags(own: MountedGear, mate: MountedGear | undefined): string[] {
  if (own.gear.helixAngleDeg === 0 || !mate) return [];
  const flags: string[] = [];
  const [hand, mateHand] = [handOf(own), handOf(mate)];
  if (hand === null) flags.push(FLAG.handNotChosen);
  if (hand !== null && hand === mateHand) flags.push(FLAG.sameHand);
  if ((own.part === null) !== (mate.part === null)) flags.push(FLAG.bothHandsNeeded);
  return flags;
}

function handOf(mounted: MountedGear): KitGear['hand'] {
  return partGear(mounted)?.hand ?? mounted.gear.hand ?? null;
}
