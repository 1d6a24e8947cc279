import { type SubstituteDto } from './dto/substitutes.dto.js';

type Order = (a: SubstituteDto, b: SubstituteDto) => number;

/**
 * The order in which substitutes are shown: the named successor; those with nothing to check; then by arrival, price
 * (house currency first, others by their code: there are no exchange rates) and number. Unknown comes last.
 */
export function bySuitability(houseCurrency: string): Order {
  const orders: Order[] = [
    (a, b) => Number(b.successor) - Number(a.successor),
    (a, b) => Math.sign(a.toCheck.length) - Math.sign(b.toCheck.length),
    (a, b) => known(a.arrivalDays, b.arrivalDays),
    (a, b) => Number(a.offer === null) - Number(b.offer === null),
    (a, b) => Number(b.offer?.currency === houseCurrency) - Number(a.offer?.currency === houseCurrency),
    (a, b) => text(a.offer?.currency ?? '', b.offer?.currency ?? ''),
    (a, b) => known(a.offer?.lineTotal ?? null, b.offer?.lineTotal ?? null),
    (a, b) => text(a.part.number, b.part.number),
  ];
  return (a, b) => orders.reduce((result, order) => result || order(a, b), 0);
}

function known(a: number | null, b: number | null): number {
  if (a === null || b === null) return Number(a === null) - Number(b === null);
  return a - b;
}

function text(a: string, b: string): number {
  return a < b ? -1 : Number(a > b);
}
