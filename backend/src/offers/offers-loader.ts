import { Injectable } from '@nestjs/common';
import { plainToInstance } from 'class-transformer';
import { validateSync } from 'class-validator';
import { DataSource } from 'typeorm';
import { type AuditRecord } from '../audit/audit.service.js';
import { politePause } from '../common/polite-pause.js';
import { underPath } from '../common/under-path.js';
import { validationProblem } from '../common/validation.js';
import { WriteQueue } from '../database/write-queue.js';
import { under } from '../parts/under.js';
import { Supplier } from '../suppliers/entities/supplier.entity.js';
import { OfferInputDto } from './dto/offer-input.dto.js';
import { OfferReader } from './offer-reader.js';
import { type NewOffer, OfferWriter } from './offer-writer.js';
import { offerableParts } from './offerable-parts.js';
import { resolvedOffer } from './resolved-offer.js';

/** Offers written in one transaction: other writers wait that long. */
const CHUNK = 200;

/** Adds many offers by the same rules as one, without keeping anybody waiting. */
@Injectable()
export class OffersLoader {
  constructor(
    private readonly source: DataSource,
    private readonly queue: WriteQueue,
    private readonly reader: OfferReader,
    private readonly writer: OfferWriter,
  ) {}

  /**
   * Checks every input first, then adds them in chunks, each in its own transaction.
   * @returns the ids, in the order of the inputs
   * @throws ProblemError naming `offers.<index>.…` before anything is added
   */
  async createMany(actor: AuditRecord['actor'], inputs: readonly OfferInputDto[]): Promise<string[]> {
    const pause = politePause();
    const checked = await this.check(inputs, pause);
    const ids: number[] = [];
    for (let start = 0; start < checked.length; start += CHUNK) {
      const chunk = checked.slice(start, start + CHUNK);
      // Reads go on beside an open transaction, so the loop may be left in the middle of one.
      ids.push(...(await this.queue.run((manager) => this.writer.insert(manager, actor, chunk, pause))));
    }
    return ids.map(String);
  }

  private async check(inputs: readonly OfferInputDto[], pause: () => Promise<void>): Promise<NewOffer[]> {
    const stated: OfferInputDto[] = [];
    for (const [index, input] of inputs.entries()) {
      stated.push(checkInput(input, index));
      await pause();
    }
    const suppliers = new Map((await this.source.manager.find(Supplier)).map((row) => [row.code, row]));
    const parts = await offerableParts(
      this.source.manager,
      stated.map(({ partNumber }) => partNumber),
    );
    const today = this.reader.today();
    const offers: NewOffer[] = [];
    for (const [index, input] of stated.entries()) {
      const part = parts.get(input.partNumber.toLowerCase());
      const supplier = suppliers.get(input.supplierCode.toUpperCase());
      offers.push(underPath(`offers.${index}`, () => resolvedOffer(input, part, supplier, today)));
      await pause();
    }
    return offers;
  }
}

function checkInput(raw: OfferInputDto, index: number): OfferInputDto {
  const input = plainToInstance(OfferInputDto, raw);
  const faults = validateSync(input, { whitelist: true, forbidNonWhitelisted: true });
  if (faults.length > 0) throw validationProblem([under(`offers.${index}`, faults)]);
  return input;
}
