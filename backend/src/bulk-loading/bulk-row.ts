import { type OfferInputDto } from '../offers/dto/offer-input.dto.js';
import { type PartInputDto } from '../parts/dto/part-input.dto.js';

/** What was counted when a part came into the library. */
export interface OpeningCount {
  place: string;
  /** In the part's unit. */
  quantity: number;
}

/** One part to load, with what is offered for it and what lies on the shelf. */
export interface BulkRow {
  part: PartInputDto;
  /** In the part's unit; null or left out: nobody watches the shelf. */
  leastStock?: number | null;
  offers?: readonly Omit<OfferInputDto, 'partNumber'>[];
  opening?: OpeningCount | null;
}

/**
 * Where the rows come from: a module whose default export gives them one after the other, so that they never all stand
 * in memory. The thread imports it; what it is given must survive being copied to a thread.
 */
export interface BulkSource {
  /** Address of the module, `file:…`; chosen by the program, never by a request. */
  module: string;
  options: unknown;
}

/** The default export of a source's module. */
export type BulkRows = (options: unknown) => Iterable<BulkRow> | AsyncIterable<BulkRow>;
