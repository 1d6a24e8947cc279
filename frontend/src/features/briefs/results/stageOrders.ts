import type { TrainOption } from '../../../api/types';

/** Where an option stands among those with the very same stages: `{ place: 2, of: 6 }`. */
export interface StageOrder {
  place: number;
  of: number;
}

/**
 * Options that have the same stages in another order, by option key. The order moves the box and the backlash and
 * nothing else, so that such rows look alike; an option alone with its stages is left out.
 */
export function stageOrders(options: readonly TrainOption[]): Map<string, StageOrder> {
  const alike = new Map<string, string[]>();
  for (const option of options) {
    const stages = stagesKey(option);
    const keys = alike.get(stages);
    if (keys) keys.push(option.key);
    else alike.set(stages, [option.key]);
  }
  const orders = new Map<string, StageOrder>();
  for (const keys of alike.values()) {
    if (keys.length < 2) continue;
    keys.forEach((key, index) => orders.set(key, { place: index + 1, of: keys.length }));
  }
  return orders;
}

/** The stages whatever their order. */
function stagesKey({ stages }: TrainOption): string {
  return stages
    .map(({ pinionTeeth, wheelTeeth, module }) => `${pinionTeeth}/${wheelTeeth}/${module}`)
    .sort()
    .join(' ');
}

/** `order 2 of 6`. */
export const orderWords = ({ place, of }: StageOrder): string => `order ${place} of ${of}`;
