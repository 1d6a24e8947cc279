import { formatTrimmed } from '../units/index.js';
import { bearingBoreFor, isBearingBore } from './bearing-bore.js';
import { type KitItem } from './bom-line.js';
import { FLAG } from './flags.js';
import { type KitRequest, type KitShaft } from './kit.js';
import { keyFor, shaftMass, type MountedGear } from './mounted-gear.js';
import { keyVolume } from './parallel-key.js';
import { type PartFinder } from './part-finder.js';
import { kitItem } from './part-lines.js';
import { retainingRingBelow, retainingRingForShaft } from './retaining-ring.js';

const STEEL_DENSITY = 7850;

/**
 * The kit of every shaft: the shaft itself unless its pinion is cut on it, two bearings, a key and a retaining ring per
 * keyed gear, one more ring at the locating bearing, and a seal where the shaft leaves the housing (first and last).
 */
export function shaftItems(
  request: KitRequest,
  mounted: readonly MountedGear[],
  library: PartFinder,
): KitItem[] {
  const last = Math.max(...request.shafts.map((shaft) => shaft.index));
  return [...request.shafts]
    .sort((a, b) => a.index - b.index)
    .flatMap((shaft) => {
      const gears = mounted.filter((gear) => gear.shaft.index === shaft.index);
      const keyed = gears.flatMap((gear) => (gear.bore === null ? [] : [{ ...gear, bore: gear.bore }]));
      const source = `Shaft ${shaft.index}`;
      return [
        ...(keyed.length === gears.length ? [shaftItem(shaft, library)] : []),
        bearingItem(shaft, library),
        ...keyed.map((gear) => keyItem(gear, library)),
        ...keyed.map((gear) => ringItem(gear.bore, gear.source, library)),
        ringItem(shaft.diameter, `${source}, locating bearing`, library),
        ...(shaft.index === 0 ? [sealItem(shaft, `${source}, input`, library)] : []),
        ...(shaft.index === last ? [sealItem(shaft, `${source}, output`, library)] : []),
      ];
    });
}

function shaftItem(shaft: KitShaft, library: PartFinder): KitItem {
  const { diameter, length } = shaft;
  const need = { kind: 'shaft' as const, partNumber: shaft.partNumber ?? null, diameter, length };
  const part = library.find(need);
  const stockLength = part?.length ?? null;
  const flags: string[] = [];
  // The span is between the bearing faces: a shaft no longer than that has nothing for the bearings to sit on.
  if (stockLength !== null && stockLength <= length) {
    const [held, span] = [formatTrimmed(stockLength, 2), formatTrimmed(length, 2)];
    flags.push(`${held} mm long in stock, more than ${span} mm needed`);
  }
  const cut = stockLength !== null && stockLength > length;
  return kitItem(
    {
      kind: 'shaft',
      wanted: shaft.partNumber ?? null,
      description: `Shaft Ø${formatTrimmed(diameter, 3)} × ${formatTrimmed(length, 2)} mm`,
      quantity: 1,
      material: shaft.material ?? null,
      supply: 'made',
      mass: shaftMass(shaft),
      source: `Shaft ${shaft.index}`,
      note: cut
        ? `Cut from stock: ${formatTrimmed(length, 2)} mm between bearing faces, and seats and shaft ends as drawn.`
        : 'Length between bearing faces; seats and shaft ends as drawn.',
      flags,
      need,
    },
    part,
  );
}

function bearingItem({ diameter, index }: KitShaft, library: PartFinder): KitItem {
  const flags: string[] = [FLAG.sizeNotChecked];
  if (!isBearingBore(diameter)) {
    const next = bearingBoreFor(diameter);
    const advice = next === null ? 'choose a bearing by hand' : `the next bearing bore is ${next} mm`;
    flags.push(`${formatTrimmed(diameter, 3)} mm is no bearing bore; ${advice}`);
  }
  const need = { kind: 'bearing' as const, bore: diameter };
  return kitItem(
    {
      kind: 'bearing',
      description: `Bearing, bore ${formatTrimmed(diameter, 3)} mm`,
      quantity: 2,
      material: null,
      supply: 'bought',
      mass: null,
      source: `Shaft ${index}`,
      flags,
      need,
    },
    library.find(need),
  );
}

function keyItem(gear: MountedGear & { bore: number }, library: PartFinder): KitItem {
  const key = keyFor(gear);
  const bore = formatTrimmed(gear.bore, 3);
  if (!key) {
    const flags = [`no DIN 6885-1 key for bore ${bore} mm: choose another way to hold the gear`];
    const description = `Key for bore ${bore} mm`;
    return kitItem({ ...boughtSteel('key', description, gear.source), mass: null, flags }, null);
  }
  const { width, height, length, fits } = key;
  const flags = fits
    ? []
    : [`key ${length} mm is longer than the hub, ${formatTrimmed(gear.hubLength, 2)} mm`];
  const description = `Parallel key DIN 6885-1 A ${width} × ${height} × ${length}`;
  const mass = keyVolume(width, height, length) * STEEL_DENSITY * 1e-9;
  const note = `Keyway: t1 ${key.shaftDepth.toFixed(1)} mm in the shaft, t2 ${key.hubDepth.toFixed(1)} mm in the hub.`;
  const need = { kind: 'key' as const, width, height, length };
  return kitItem(
    { ...boughtSteel('key', description, gear.source), mass, note, flags, need },
    library.find(need),
  );
}

function ringItem(seat: number, source: string, library: PartFinder): KitItem {
  const ring = retainingRingForShaft(seat);
  const size = formatTrimmed(seat, 3);
  if (!ring) {
    const below = retainingRingBelow(seat);
    const advice = below
      ? `step the seat to ${below.shaftDiameter} mm or use another way`
      : 'use another way';
    const flags = [`DIN 471 has no ring for ${size} mm: ${advice}`];
    const description = `Retaining ring for shaft Ø${size} mm`;
    return kitItem({ ...boughtSteel('retaining-ring', description, source), mass: null, flags }, null);
  }
  const { shaftDiameter, thickness } = ring;
  const description = `Retaining ring DIN 471 ${shaftDiameter} × ${thickness}`;
  const note = `Groove Ø${ring.grooveDiameter} mm, ${ring.grooveWidth} mm wide.`;
  const need = { kind: 'retaining-ring' as const, shaftDiameter, thickness };
  return kitItem(
    { ...boughtSteel('retaining-ring', description, source), mass: null, note, need },
    library.find(need),
  );
}

function sealItem({ diameter }: KitShaft, source: string, library: PartFinder): KitItem {
  const need = { kind: 'seal' as const, shaftDiameter: diameter };
  return kitItem(
    {
      kind: 'seal',
      description: `Rotary shaft seal, shaft Ø${formatTrimmed(diameter, 3)} mm`,
      quantity: 1,
      material: null,
      supply: 'bought',
      mass: null,
      source,
      need,
    },
    library.find(need),
  );
}

function boughtSteel(kind: KitItem['kind'], description: string, source: string) {
  return { kind, description, quantity: 1, material: 'steel', supply: 'bought' as const, source };
}
