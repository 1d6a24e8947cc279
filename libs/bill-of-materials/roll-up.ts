import { type BomLine, type KitItem } from './bom-line.js';
import { type GearDataRow } from './gear-data.js';
import { type PartNeed } from './part-finder.js';
import { BOM_KINDS } from './part-kinds.js';

/** Find numbers of one kind. */
const BLOCK = 100;

/**
 * Merges equal parts and numbers the lines. Equal means the same number, make, material, supply, mass and gear data
 * (the mate aside), and no key of their own or the same; quantities add up, sources, notes and flags are kept. Lines stand by kind in the declared order
 * and, within a kind, in the order in which they first came. Every line gets a key of its own.
 */
export function rollUp(items: readonly KitItem[]): BomLine[] {
  const merged = new Map<string, KitItem>();
  for (const item of items) {
    const key = identity(item);
    const line = merged.get(key);
    merged.set(key, line ? joined(line, item) : item);
  }
  const lines = withKeys([...merged.values()]);
  return BOM_KINDS.flatMap((kind, block) =>
    lines
      .filter((line) => line.kind === kind)
      .map((line, index) => ({ findNumber: findNumber(block, index), ...line })),
  );
}

/** People may add more lines than a block of a hundred holds: the rest is numbered far above all blocks. */
function findNumber(block: number, index: number): number {
  return (block + 1) * (index < BLOCK - 1 ? BLOCK : BLOCK * BLOCK) + index + 1;
}

/** Where lines share a part number or a description, all but the first are told apart by a count. */
function withKeys(items: readonly KitItem[]): Omit<BomLine, 'findNumber'>[] {
  const taken = new Set<string>();
  return items.map((item) => {
    const name = item.key ?? item.partNumber ?? `${item.kind}: ${item.description}`;
    let key = name;
    for (let count = 2; taken.has(key); count += 1) key = `${name} (${count})`;
    taken.add(key);
    return { ...item, key };
  });
}

function identity(item: KitItem): string {
  const teeth = item.gearData?.filter((row) => row.group !== 'mate').map((row) => row.value);
  const { key = null, kind, partNumber, description, unit, material, supply, supplier, mass } = item;
  return JSON.stringify([key, kind, partNumber, description, unit, material, supply, supplier, mass, teeth]);
}

function joined(line: KitItem, item: KitItem): KitItem {
  const whole: KitItem = {
    ...line,
    // Litres are held to 0.1; the sum of decimals must not grow a tail.
    quantity: Number((line.quantity + item.quantity).toFixed(6)),
    source: union(line.source, item.source),
    note: union([line.note], [item.note]).filter(Boolean).join(' '),
    flags: union(line.flags, item.flags),
    ...(line.needs && item.needs ? { needs: distinct([...line.needs, ...item.needs]) } : {}),
  };
  if (!line.gearData || !item.gearData) return whole;
  return { ...whole, gearData: joinedGearData(line.gearData, item.gearData) };
}

/** Rows that differ (the mate's only) show every value. */
function joinedGearData(rows: GearDataRow[], others: GearDataRow[]): GearDataRow[] {
  return rows.map((row, index) => {
    const other = others[index]?.value ?? null;
    if (other === row.value) return row;
    const values = union(String(row.value ?? 'to be made').split('; '), [String(other ?? 'to be made')]);
    return { ...row, value: values.join('; ') };
  });
}

/** Needs that are the same are asked once. */
function distinct(needs: readonly PartNeed[]): PartNeed[] {
  return [...new Map(needs.map((need) => [JSON.stringify(need), need])).values()];
}

function union(first: readonly string[], second: readonly string[]): string[] {
  return [...new Set([...first, ...second])];
}
