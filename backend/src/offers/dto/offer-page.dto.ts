import { ApiSchema } from '@nestjs/swagger';
import { PageOf } from '../../common/list-query.js';
import { OfferDto } from './offer.dto.js';

/** One page of the offers. */
@ApiSchema({ name: 'OfferPage' })
export class OfferPageDto extends PageOf(OfferDto) {}
