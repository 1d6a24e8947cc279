import { Injectable } from '@nestjs/common';
import { describeTrain, type TrainOption } from '@stageyard/libs/train-planner';
import { type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Brief } from '../briefs/entities/brief.entity.js';
import { Pin } from '../briefs/entities/pin.entity.js';
import { DEFAULT_BUILD_QUANTITY, type Requirement } from '../briefs/requirement.js';
import { Clock } from '../common/clock.js';
import { notFound } from '../common/errors.js';
import { nextCode } from '../common/next-code.js';
import { rowId } from '../common/row-id.js';
import { updateVersioned } from '../database/update-versioned.js';
import { WriteQueue } from '../database/write-queue.js';
import { OptionSearch } from '../option-searches/entities/option-search.entity.js';
import { specFromOption } from './adopt-option.js';
import { type AdoptedSpec, gearsOf, gearsOnShaft } from './adopted-spec.js';
import { type TrainDto } from './dto/train.dto.js';
import { type TrainInputDto } from './dto/train-input.dto.js';
import { type TrainPatchDto } from './dto/train-patch.dto.js';
import { Train } from './entities/train.entity.js';
import { gearLinesOf } from './gear-lines.js';
import { patchSpec } from './patch-spec.js';
import { chooseShaftDiameters } from './shaft-diameters.js';
import { StockGears } from './stock-gears.service.js';
import { TrainReader } from './train-reader.js';

type Person = Pick<SignedInUser, 'id' | 'name'>;

/** Adopting options as trains, and changing them. */
@Injectable()
export class TrainsService {
  constructor(
    private readonly writes: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly reader: TrainReader,
    private readonly stock: StockGears,
  ) {}

  /**
   * Makes a train of an option, revision A, with stock gears where the library has the very same, and shafts sized.
   * It takes the brief's build quantity along.
   * @throws ProblemError 404 for an unknown brief, search or option
   */
  async adopt(input: TrainInputDto, actor: Person): Promise<TrainDto> {
    const briefId = rowId(input.briefId, 'brief');
    const now = this.clock.iso();
    const code = await this.writes.run(async (manager) => {
      const brief = await manager.findOneBy(Brief, { id: briefId });
      if (!brief) throw notFound('brief', input.briefId);
      const { option, requirement } = await findOption(manager, briefId, input);
      const buildQuantity = brief.requirement.buildQuantity ?? null;
      const train = await manager.save(Train, {
        code: await nextCode(manager, Train, 'T'),
        title: input.title ?? brief.title,
        note: '',
        revision: 'A',
        state: 'working' as const,
        briefId,
        optionKey: option.key,
        spec: await this.completeSpec(specFromOption(option, requirement), buildQuantity),
        buildQuantity,
        bomEdits: null,
        offerChoices: null,
        ownerId: actor.id,
        version: 1,
        createdAt: now,
        updatedAt: now,
      });
      await manager.update(Brief, { id: briefId }, { standing: 'adopted' });
      await this.audit.record(manager, {
        actor,
        action: 'adopted',
        entity: 'train',
        entityId: train.code,
        summary: `Adopted ${teethOf(option)} of ${brief.code} as ${train.code}`,
        after: audited(train),
      });
      return train.code;
    });
    return this.reader.get(code);
  }

  /**
   * Changes what the patch names.
   * @throws ProblemError 400 naming every choice that cannot be, 404, or 409 when the train changed since
   */
  async edit(code: string, patch: TrainPatchDto, actor: Person): Promise<TrainDto> {
    await this.writes.run(async (manager) => {
      const before = await this.reader.load(manager, code);
      const spec = patchSpec(before.spec, patch, await this.partsOf(before.spec, patch));
      const change = {
        ...(patch.title === undefined ? {} : { title: patch.title }),
        ...(patch.note === undefined ? {} : { note: patch.note }),
        spec,
        updatedAt: this.clock.iso(),
      };
      const current = () => this.reader.describe(before);
      const after = await updateVersioned<Train>(manager, Train, { code }, patch.version, change, current);
      await this.audit.record(manager, {
        actor,
        action: 'changed',
        entity: 'train',
        entityId: code,
        summary: `Changed the train ${code}`,
        before: audited(before),
        after: audited(after),
      });
    });
    return this.reader.get(code);
  }

  /** Adds what the option does not say: stock parts that are exactly its gears, and shaft diameters. */
  private async completeSpec(spec: AdoptedSpec, buildQuantity: number | null): Promise<AdoptedSpec> {
    const bores = new Map<string, number>();
    const lines = gearLinesOf(spec, buildQuantity ?? DEFAULT_BUILD_QUANTITY);
    const matches = await this.stock.matchMany(lines.map(({ need }) => need));
    lines.forEach(({ places }, index) => {
      const match = matches[index];
      for (const { gear } of places) gear.partNumber = match?.number ?? null;
      if (match?.bore) bores.set(match.number, match.bore);
    });
    const demands = describeTrain(spec).shafts.map(({ leastDiameter, index }) => ({
      leastDiameter,
      bores: gearsOnShaft(spec, index).flatMap(({ gear }) => bores.get(gear.partNumber ?? '') ?? []),
    }));
    return { ...spec, shafts: chooseShaftDiameters(spec, demands) };
  }

  /** The parts that the patch names and those chosen before, by number. */
  private partsOf(spec: AdoptedSpec, { stages }: TrainPatchDto) {
    const named = (stages ?? []).flatMap(({ pinion, wheel }) => [pinion?.partNumber, wheel?.partNumber]);
    const chosen = gearsOf(spec).map(({ gear }) => gear.partNumber);
    return this.stock.byNumber([...named, ...chosen].filter((number) => typeof number === 'string'));
  }
}

/** The option in the search that found it, or in the pin that keeps it, with the requirement it answers to. */
async function findOption(
  manager: EntityManager,
  briefId: number,
  { searchId, optionKey }: TrainInputDto,
): Promise<{ option: TrainOption; requirement: Requirement }> {
  const search = await manager.findOneBy(OptionSearch, { id: rowId(searchId, 'search'), briefId });
  if (!search) throw notFound('search of this brief', searchId);
  const found = search.outcome?.options.find(({ key }) => key === optionKey);
  if (found) return { option: found, requirement: search.request };
  const pin = await manager.findOneBy(Pin, { briefId, optionKey, searchId: search.id });
  if (!pin) throw notFound('option of this search', optionKey);
  return { option: pin.option, requirement: search.request };
}

function audited({ title, note, spec, version }: Pick<Train, 'title' | 'note' | 'spec' | 'version'>) {
  return { title, note, spec, version };
}

/** `18/66 · 18/72`: the option as the screens write it; its key is for programs. */
function teethOf({ stages }: Pick<TrainOption, 'stages'>): string {
  return stages.map(({ pinionTeeth, wheelTeeth }) => `${pinionTeeth}/${wheelTeeth}`).join(' · ');
}
