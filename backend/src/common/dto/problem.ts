import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';

/** One field at fault. */
export class ProblemField {
  @ApiProperty({ type: String, description: 'Dotted path as in the request, such as pinion.teeth.' })
  field!: string;

  @ApiProperty({
    oneOf: [{ type: 'string' }, { type: 'number' }, { type: 'boolean' }],
    nullable: true,
    description:
      'The value sent; long text is cut, lists and objects are shown as text, secrets are left out.',
  })
  value!: string | number | boolean | null;

  @ApiPropertyOptional({ oneOf: [{ type: 'number' }, { type: 'string' }] })
  limit?: number | string;

  @ApiProperty({ type: String })
  message!: string;
}

/** The shape of every refusal. */
export class Problem {
  @ApiProperty({ type: 'integer' })
  statusCode!: number;

  @ApiProperty({ type: String, description: 'For programs; stable.' })
  code!: string;

  @ApiProperty({ type: String, description: 'For people: what, why, and what to do.' })
  message!: string;

  @ApiPropertyOptional({ type: [ProblemField] })
  errors?: ProblemField[];

  @ApiProperty({ type: String, description: 'Also in the server log, to find the request again.' })
  requestId!: string;

  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: true,
    description:
      'Of a stale edit (code changed-meanwhile) or of what the shelf cannot give: the thing as it stands now.',
  })
  current?: Record<string, unknown>;

  @ApiPropertyOptional({ type: String, description: 'Of a second search: the one that still runs.' })
  searchId?: string;

  @ApiPropertyOptional({ type: String, description: 'Of a second search: the brief that it searches for.' })
  briefId?: string;

  @ApiPropertyOptional({
    type: 'integer',
    description: 'Of a refusal that ends by itself: how long to wait, s.',
  })
  retryAfterSeconds?: number;
}
