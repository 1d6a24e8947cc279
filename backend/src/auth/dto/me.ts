import { ApiProperty } from '@nestjs/swagger';
import { type Permission, PERMISSIONS, type Role, ROLES } from '../permissions.js';
import { type SignedInUser } from '../signed-in-user.js';

/** The person who is signed in. */
export class Me {
  @ApiProperty({ type: String })
  id!: string;

  @ApiProperty({ type: String })
  name!: string;

  @ApiProperty({ type: String })
  email!: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles!: Role[];

  @ApiProperty({ enum: PERMISSIONS, enumName: 'Permission', isArray: true })
  permissions!: Permission[];
}

export function toMe({ id, name, email, roles, permissions }: SignedInUser): Me {
  return { id, name, email, roles, permissions };
}
