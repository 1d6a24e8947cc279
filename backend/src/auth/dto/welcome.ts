import { ApiProperty } from '@nestjs/swagger';
import { type Role, ROLES } from '../permissions.js';

/** A known account of demo mode. */
export class WelcomeAccount {
  @ApiProperty({ type: String })
  email!: string;

  @ApiProperty({ type: String })
  name!: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  role!: Role;
}

/** What the sign-in page shows before anybody is signed in. */
export class Welcome {
  @ApiProperty({ type: Boolean })
  demo!: boolean;

  @ApiProperty({ type: [WelcomeAccount], description: 'Empty outside demo mode.' })
  accounts!: WelcomeAccount[];

  @ApiProperty({ type: String, nullable: true, description: 'Of the demo accounts; null outside demo mode.' })
  password!: string | null;
}
