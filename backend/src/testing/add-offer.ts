import { type INestApplicationContext } from '@nestjs/common';
import { type OfferInputDto } from '../offers/dto/offer-input.dto.js';
import { type OfferDto } from '../offers/dto/offer.dto.js';
import { OffersService } from '../offers/offers.service.js';
import { type SupplierInputDto } from '../suppliers/dto/supplier-input.dto.js';
import { type SupplierDto } from '../suppliers/dto/supplier.dto.js';
import { SuppliersService } from '../suppliers/suppliers.service.js';
import { newOffer, newSupplier } from './new-offer.js';

const PURCHASER = { id: 'purchaser', name: 'Pia Quay' };

/** Adds a supplier that asks for euros. */
export function addSupplier(
  app: INestApplicationContext,
  changes: Partial<SupplierInputDto> = {},
): Promise<SupplierDto> {
  return app.get(SuppliersService).create(PURCHASER, newSupplier(changes));
}

/** Adds an offer in the supplier's currency, valid since long ago. */
export function addOffer(
  app: INestApplicationContext,
  partNumber: string,
  supplierCode: string,
  changes: Partial<OfferInputDto> = {},
): Promise<OfferDto> {
  const offer = newOffer({ partNumber, supplierCode, validFrom: '2020-01-01', ...changes });
  return app.get(OffersService).create(PURCHASER, offer);
}
