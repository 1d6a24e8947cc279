import { answer, api } from '../../../api/client';
import type { StockItem } from '../../../api/types';

const KEY = 'stageyard.shelf';
const PAGE = 100;
/** Parts at one place that are kept on the device; beyond that a shelf is a warehouse. */
const MOST_PAGES = 20;

interface KeptShelf {
  place: string;
  items: StockItem[];
}

/** Keeps what lies at a place on the device, so that a part can be looked up where the network does not reach. */
export async function keepShelf(place: string): Promise<void> {
  const items: StockItem[] = [];
  for (let page = 1; page <= MOST_PAGES; page += 1) {
    const found = await answer(api.GET('/api/stock', { params: { query: { place, page, size: PAGE } } }));
    items.push(...found.items);
    if (items.length >= found.total) break;
  }
  try {
    localStorage.setItem(KEY, JSON.stringify({ place, items } satisfies KeptShelf));
  } catch {
    // No room, or none allowed: looking parts up then needs the network.
  }
}

/** A part as it stood at the place when the network was last there; null when it is not kept. */
export function keptItem(place: string, number: string): StockItem | null {
  try {
    const kept = JSON.parse(localStorage.getItem(KEY) ?? 'null') as KeptShelf | null;
    if (kept?.place.toLowerCase() !== place.toLowerCase()) return null;
    return kept.items.find((item) => item.number.toLowerCase() === number.toLowerCase()) ?? null;
  } catch {
    return null;
  }
}
