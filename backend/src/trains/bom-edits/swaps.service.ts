import { Injectable } from '@nestjs/common';
import { type BomLine, type EditedBom, neededQuantity } from '@stageyard/libs/bill-of-materials';
import { formatTrimmed } from '@stageyard/libs/units';
import { type SignedInUser } from '../../auth/signed-in-user.js';
import { DEFAULT_BUILD_QUANTITY } from '../../briefs/requirement.js';
import { badInput } from '../../common/errors.js';
import { type Part } from '../../parts/entities/part.entity.js';
import { SupplyOfParts } from '../../substitutes/supply-of-parts.service.js';
import { BomService } from '../bom.service.js';
import { type Train } from '../entities/train.entity.js';
import { StockGears } from '../stock-gears.service.js';
import { TrainReader } from '../train-reader.js';
import { BomEditing } from './bom-editing.service.js';
import { type SwapInputDto } from './dto/swap-input.dto.js';
import { type SwapChangeDto, type SwapResultDto } from './dto/swap-result.dto.js';
import {
  type BomDraft,
  chooseForLine,
  draftOf,
  gearPlaces,
  isGearLine,
  refuseChoice,
} from './line-choice.js';
import { supplyChanges } from './swap-supply.js';
import { changedChecks, swapChanges, type TrainState } from './swap-changes.js';

/** Takes other parts for lines of a bill of materials, and says what that changes. */
@Injectable()
export class Swaps {
  constructor(
    private readonly editing: BomEditing,
    private readonly reader: TrainReader,
    private readonly boms: BomService,
    private readonly stock: StockGears,
    private readonly supply: SupplyOfParts,
  ) {}

  /**
   * A swap that changes nothing is not booked. All places of a gear's line are swapped together.
   * @throws ProblemError 400 naming the key or the part number, 404, or 409 when the train changed since
   */
  async swap(code: string, input: SwapInputDto, user: SignedInUser): Promise<SwapResultDto> {
    const train = await this.editing.seen(code, input.version);
    const figures = await this.reader.figures(train);
    const bom = await this.boms.build(train, figures);
    const line = bom.lines.find(({ key }) => key === input.key);
    const draft = draftOf(train);
    await this.choose(draft, bom, line, input, code);
    const before: TrainState = { figures, lines: bom.lines, line };
    const after = await this.stateOf({ ...train, ...draft }, line);
    const changes = [
      ...swapChanges(before, after),
      ...(await this.supplyChanges(train, line, after.line, user)),
    ];
    const checks = changedChecks(figures, after.figures);
    const unchanged = JSON.stringify(draft) === JSON.stringify(draftOf(train));
    if (input.dryRun) return { train: null, changes, checks };
    if (unchanged) return { train: await this.reader.describe(train), changes, checks };
    const booked = await this.editing.book(train, draft, user, 'swapped', summaryOf(code, line, after.line));
    return { train: booked, changes, checks };
  }

  private async choose(
    draft: BomDraft,
    bom: EditedBom,
    line: BomLine | undefined,
    { key, partNumber = null }: SwapInputDto,
    code: string,
  ): Promise<void> {
    if (!line) {
      if (partNumber !== null || !bom.idleKeys.includes(key)) throw noSuchLine(code, key);
      delete draft.bomEdits.swaps[key];
      return;
    }
    const part = partNumber === null ? null : await this.partOf(draft, line, partNumber);
    if (part === null && line.extraLineId !== undefined) {
      const message =
        'An added line has no part of the kit’s own to put back. Choose another part, or take the line away.';
      throw badInput([{ field: 'partNumber', value: partNumber, message }]);
    }
    chooseForLine(draft, line, part);
  }

  private async partOf(draft: BomDraft, line: BomLine, number: string): Promise<Part | null> {
    const part = (await this.stock.byNumber([number])).get(number);
    const message = refuseChoice(draft.spec, line, number, part);
    if (message !== null) throw badInput([{ field: 'partNumber', value: number, message }]);
    return part ?? null;
  }

  private async stateOf(train: Train, was: BomLine | undefined): Promise<TrainState> {
    const figures = await this.reader.figures(train);
    const { lines } = await this.boms.build(train, figures);
    return { figures, lines, line: was && lineAfter(lines, was, train) };
  }

  private async supplyChanges(
    { buildQuantity, offerChoices }: Train,
    before: BomLine | undefined,
    after: BomLine | undefined,
    user: SignedInUser,
  ): Promise<SwapChangeDto[]> {
    if (!before || !after || !user.permissions.includes('prices.read')) return [];
    const quantity = neededQuantity(after.quantity, buildQuantity ?? DEFAULT_BUILD_QUANTITY);
    if (quantity === null) return [];
    const numbers = [before, after].flatMap(({ partNumber }) => partNumber ?? []);
    // The same offers as the prices of the train name, so that both say the same of the line.
    const rule = { prefer: 'price', choices: offerChoices ?? {} } as const;
    const supply = await this.supply.of(numbers, quantity, user, rule);
    const of = ({ partNumber }: BomLine) => (partNumber === null ? null : (supply.get(partNumber) ?? null));
    return supplyChanges(`${formatTrimmed(quantity, 3)} ${after.unit}`, of(before), of(after));
  }
}

/** The same line after the swap: a gear's by its places, since its key is the part's number. */
function lineAfter(lines: readonly BomLine[], was: BomLine, { spec }: Train): BomLine | undefined {
  if (!isGearLine(was) || was.extraLineId !== undefined) return lines.find(({ key }) => key === was.key);
  const [place] = gearPlaces(was, spec);
  return lines.find(
    (line) =>
      isGearLine(line) &&
      gearPlaces(line, spec).some(({ stage, role }) => stage === place?.stage && role === place.role),
  );
}

function noSuchLine(code: string, key: string) {
  const message = `The bill of materials of ${code} has no line “${key.slice(0, 60)}”. It may have changed: open it again.`;
  return badInput([{ field: 'key', value: key, message }]);
}

function summaryOf(code: string, before: BomLine | undefined, after: BomLine | undefined): string {
  const name = (line: BomLine | undefined) => line?.partNumber ?? line?.description ?? 'an unused choice';
  return after
    ? `Took ${name(after)} in place of ${name(before)} on ${code}`
    : `Took back ${name(before)} on ${code}`;
}
