/** Everything that can stand on a bill of materials, by kind; each kind has its own attributes. */
export const PART_KINDS = [
  'gear',
  'pinion-shaft',
  'shaft',
  'bearing',
  'key',
  'retaining-ring',
  'seal',
  'housing',
  'fastener',
  'lubricant',
  'other',
] as const;
export type PartKind = (typeof PART_KINDS)[number];

/** `draft` is being entered, `cleared` may be used in trains, `withdrawn` is no longer used. */
export const PART_STANDINGS = ['draft', 'cleared', 'withdrawn'] as const;
export type PartStanding = (typeof PART_STANDINGS)[number];

export const PART_SUPPLIES = ['made', 'bought'] as const;
export type PartSupply = (typeof PART_SUPPLIES)[number];

export const HANDS = ['left', 'right'] as const;
export type Hand = (typeof HANDS)[number];

/** Kinds with teeth, whose geometry is computed and whose figures can be filtered. */
export function isToothed(kind: PartKind): kind is 'gear' | 'pinion-shaft' {
  return kind === 'gear' || kind === 'pinion-shaft';
}
