import { plainToInstance } from 'class-transformer';
import { validateSync } from 'class-validator';
import { badInput } from '../common/errors.js';
import { type QuickCheck, quickCheck } from '../common/quick-check.js';
import { validationProblem } from '../common/validation.js';
import { under } from './under.js';
import { contradictions } from './attribute-rules.js';
import { ATTRIBUTES_OF_KIND, type PartAttributes } from './dto/attributes/part-attributes.js';
import { ToothedAttributes } from './dto/attributes/toothed-attributes.js';
import { toothedGeometry } from './part-geometry.js';
import { PART_KINDS, type PartKind } from './part-kinds.js';

/**
 * The attributes of one kind as they are stored: defaults filled in, nothing unknown, every figure within bounds, and
 * teeth that can really be cut.
 * @throws ProblemError 400 naming `attributes.…`; InputError of the geometry library for a gear that cannot exist
 */
export function checkAttributes(kind: PartKind, raw: object): PartAttributes {
  const attributes = QUICK[kind](raw) ?? fullyChecked(kind, raw);
  if (attributes instanceof ToothedAttributes) checkHand(attributes);
  const wrong = contradictions(kind, attributes, toothedGeometry(kind, attributes));
  if (wrong.length > 0) throw badInput(wrong);
  // A plain object, as it comes back from the database, so that the two can be compared.
  return { ...attributes };
}

/** The same rules, quick where nothing is wrong. */
const QUICK = Object.fromEntries(
  PART_KINDS.map((kind) => [kind, quickCheck<PartAttributes>(ATTRIBUTES_OF_KIND[kind])]),
) as Record<PartKind, QuickCheck<PartAttributes>>;

function fullyChecked(kind: PartKind, raw: object): PartAttributes {
  const attributes: PartAttributes = plainToInstance(ATTRIBUTES_OF_KIND[kind], raw);
  const faults = validateSync(attributes, {
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: false,
  });
  if (faults.length > 0) throw validationProblem([under('attributes', faults)]);
  return attributes;
}

/** A helical gear has a hand, a spur gear has none. */
function checkHand({ helixAngleDeg, hand }: ToothedAttributes): void {
  const field = 'attributes.hand';
  if (helixAngleDeg > 0 && !hand) {
    const message = 'A helical gear needs its hand. Choose left or right, or set the helix angle to 0.';
    throw badInput([{ field, value: hand, limit: 'left, right', message }]);
  }
  if (helixAngleDeg === 0 && hand) {
    const message = 'A spur gear has no hand. Leave the hand empty, or give the helix angle.';
    throw badInput([{ field, value: hand, message }]);
  }
}
