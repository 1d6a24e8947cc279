import type { PartKind } from '../../api/types';

/** Kinds that the shelf can be narrowed to. */
export const STOCK_KINDS: readonly PartKind[] = [
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
];
