import { AuditEntry } from '../audit/entities/audit-entry.js';
import { InvitationEntity } from '../auth/entities/invitation.entity.js';
import { SessionEntity } from '../auth/entities/session.entity.js';
import { Brief } from '../briefs/entities/brief.entity.js';
import { Pin } from '../briefs/entities/pin.entity.js';
import { OptionSearch } from '../option-searches/entities/option-search.entity.js';
import { Offer } from '../offers/entities/offer.entity.js';
import { PartNumberSeries } from '../parts/entities/part-number-series.entity.js';
import { Part } from '../parts/entities/part.entity.js';
import { StockLevel } from '../stock/entities/stock-level.entity.js';
import { StockMovement } from '../stock/entities/stock-movement.entity.js';
import { Supplier } from '../suppliers/entities/supplier.entity.js';
import { Train } from '../trains/entities/train.entity.js';
import { UserEntity } from '../users/entities/user.entity.js';

/** Every entity class, for both data sources. A new entity needs a line here and a table in a migration. */
export const ENTITIES = [
  UserEntity,
  SessionEntity,
  InvitationEntity,
  AuditEntry,
  Part,
  PartNumberSeries,
  Brief,
  OptionSearch,
  Pin,
  Train,
  Supplier,
  Offer,
  StockMovement,
  StockLevel,
];
