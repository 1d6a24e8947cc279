/**
 * Kinds of parts in the order they stand on a bill of materials. Each kind owns a block of a hundred find numbers
 * (gears 101…, pinion shafts 201…), so that a change in one kind never renumbers another.
 */
export const BOM_KINDS = [
  'gear',
  'pinion-shaft',
  'shaft',
  'bearing',
  'key',
  'retaining-ring',
  'seal',
  'housing',
  'lubricant',
  'fastener',
  'other',
] as const;

export type BomKind = (typeof BOM_KINDS)[number];

export type Hand = 'left' | 'right';
