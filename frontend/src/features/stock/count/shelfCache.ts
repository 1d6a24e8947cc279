import { answer, api } from '../../../api/client';
import type { Movement, StockItem } from '../../../api/types';

const KEY = 'stageyard.shelf';
const PAGE = 100;
/** Parts at one place that are kept on the device; beyond that a shelf is a warehouse. */
const MOST_PAGES = 20;

/** What a count needs to know of a part. */
export type KeptItem = Pick<StockItem, 'number' | 'description' | 'unit' | 'places'>;

interface KeptShelf {
  place: string;
  items: KeptItem[];
}

/** Keeps what lies at a place on the device, so that a part can be looked up where the network does not reach. */
export async function keepShelf(place: string): Promise<void> {
  const items: KeptItem[] = [];
  for (let page = 1; page <= MOST_PAGES; page += 1) {
    const found = await answer(api.GET('/api/stock', { params: { query: { place, page, size: PAGE } } }));
    items.push(
      ...found.items.map(({ number, description, unit, places }) => ({ number, description, unit, places })),
    );
    if (items.length >= found.total) break;
  }
  write({ place, items });
}

/** Brings the kept shelf up to date by a movement that this device booked: the next count there has seen it. */
export function keepMovement(movement: Movement): void {
  const { number, description, unit, place, after, id, at } = movement;
  const kept = read();
  if (!kept || !isSame(kept.place, place)) return;
  const level = { place, quantity: after, lastMovementId: id, countedAt: at };
  const known = kept.items.find((item) => isSame(item.number, number));
  const others = known?.places.filter((each) => !isSame(each.place, place)) ?? [];
  const item: KeptItem = { number, description, unit, places: [...others, level] };
  write({ place: kept.place, items: [...kept.items.filter((each) => each !== known), item] });
}

/** A part as it stood at the place when the network was last there; null when it is not kept. */
export function keptItem(place: string, number: string): KeptItem | null {
  const kept = read();
  if (!kept || !isSame(kept.place, place)) return null;
  return kept.items.find((item) => isSame(item.number, number)) ?? null;
}

const isSame = (one: string, two: string): boolean => one.toLowerCase() === two.toLowerCase();

function read(): KeptShelf | null {
  try {
    return JSON.parse(localStorage.getItem(KEY) ?? 'null') as KeptShelf | null;
  } catch {
    return null;
  }
}

function write(shelf: KeptShelf): void {
  try {
    localStorage.setItem(KEY, JSON.stringify(shelf));
  } catch {
    // No room, or none allowed: looking parts up then needs the network.
  }
}
