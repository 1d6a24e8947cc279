import { AuditEntry } from '../audit/entities/audit-entry.js';
import { InvitationEntity } from '../auth/entities/invitation.entity.js';
import { SessionEntity } from '../auth/entities/session.entity.js';
import { UserEntity } from '../users/entities/user.entity.js';

/** Every entity class, for both data sources. A new entity needs a line here and a table in a migration. */
export const ENTITIES = [UserEntity, SessionEntity, InvitationEntity, AuditEntry];
