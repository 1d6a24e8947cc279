import { ApiProperty } from '@nestjs/swagger';
import { type Role, ROLES } from '../../auth/permissions.js';
import { PageOf } from '../../common/list-query.js';
import { type UserEntity } from '../entities/user.entity.js';

/** A person who can sign in. */
export class User {
  @ApiProperty({ type: String })
  id!: string;

  @ApiProperty({ type: String })
  name!: string;

  @ApiProperty({ type: String })
  email!: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles!: Role[];

  @ApiProperty({ type: Boolean })
  active!: boolean;

  @ApiProperty({ type: 'integer' })
  version!: number;

  @ApiProperty({ type: String, format: 'date-time' })
  createdAt!: string;
}

export class UserPage extends PageOf(User) {}

export function toUser({ id, name, email, roles, active, version, createdAt }: UserEntity): User {
  return { id, name, email, roles, active, version, createdAt };
}
