import { Injectable } from '@nestjs/common';
import {
  type BomLine,
  type FitPlace,
  neededQuantity,
  placeOf,
  placePart,
  type SubstitutePart,
} from '@stageyard/libs/bill-of-materials';
import { type SignedInUser } from '../../auth/signed-in-user.js';
import { DEFAULT_BUILD_QUANTITY } from '../../briefs/requirement.js';
import { badInput } from '../../common/errors.js';
import { HOUSE_RULES } from '../../house-rules/house-rules.js';
import { type Part } from '../../parts/entities/part.entity.js';
import { type SubstitutesDto } from '../../substitutes/dto/substitutes.dto.js';
import { toFitPart } from '../../substitutes/fit-part.js';
import { Substitutes } from '../../substitutes/substitutes.service.js';
import { BomService } from '../bom.service.js';
import { StockGears } from '../stock-gears.service.js';
import { TrainReader } from '../train-reader.js';

/** Parts that drop in on a line of a train. */
@Injectable()
export class LineSubstitutes {
  constructor(
    private readonly reader: TrainReader,
    private readonly boms: BomService,
    private readonly stock: StockGears,
    private readonly substitutes: Substitutes,
  ) {}

  /**
   * Parts that drop in for the line's part, as its places need it; for a line without a part, all that fit the places.
   * @param quantity left out: what all trains built at once need
   * @throws ProblemError 404, or 400 naming the key
   */
  async of(
    code: string,
    key: string,
    quantity: number | undefined,
    user: SignedInUser,
  ): Promise<SubstitutesDto> {
    const train = await this.reader.row(code);
    const { lines } = await this.boms.build(train, await this.reader.figures(train));
    const line = lines.find((one) => one.key === key);
    if (!line) {
      const message = `The bill of materials of ${code} has no line “${key.slice(0, 60)}”. It may have changed: open it again.`;
      throw badInput([{ field: 'key', value: key, message }]);
    }
    const builds = train.buildQuantity ?? DEFAULT_BUILD_QUANTITY;
    const wanted = quantity ?? neededQuantity(line.quantity, builds) ?? line.quantity;
    const own = await this.ownPart(line);
    const room = train.spec.gap ?? HOUSE_RULES.planeGap;
    const { original, place } = asked(line, own, room);
    if (!original) return { quantity: wanted, items: [], leftOut: 0 };
    return this.substitutes.ofPlace(original, place, own, wanted, user);
  }

  private async ownPart({ partNumber }: BomLine): Promise<Part | null> {
    return partNumber === null ? null : ((await this.stock.byNumber([partNumber])).get(partNumber) ?? null);
  }
}

/** What the line asks for: its own part at its places, or the places alone. */
function asked(
  { needs = [] }: BomLine,
  own: Part | null,
  room: number,
): { original: SubstitutePart | null; place: FitPlace } {
  const place = placeOf(needs, room);
  if (own) return { original: toFitPart(own), place };
  const [first] = needs;
  return { original: first ? placePart(first) : null, place };
}
