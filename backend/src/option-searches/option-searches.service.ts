import { Injectable, type MessageEvent } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type Observable } from 'rxjs';
import { type EntityManager, In, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Brief } from '../briefs/entities/brief.entity.js';
import { Clock } from '../common/clock.js';
import { conflict, notFound } from '../common/errors.js';
import { rowId } from '../common/row-id.js';
import { WriteQueue } from '../database/write-queue.js';
import { type SearchDto, toSearchDto } from './dto/search.dto.js';
import { type SearchSummaryDto, toSearchSummary } from './dto/search-summary.dto.js';
import { OptionSearch, UNFINISHED_STATES } from './entities/option-search.entity.js';
import { endedStream } from './live-search.js';
import { LISTED_SEARCHES } from './search-limits.js';
import { SearchRunner } from './search-runner.js';

/** Columns of a summary: the request and the outcome can be large and are left out. */
const SUMMARY_COLUMNS = {
  id: true,
  briefId: true,
  briefVersion: true,
  state: true,
  startedAt: true,
  finishedAt: true,
  optionCount: true,
  complete: true,
  message: true,
  startedBy: { id: true, name: true },
} as const;

/** Searches of briefs: starting, watching, stopping, reading what came out. */
@Injectable()
export class OptionSearchesService {
  constructor(
    @InjectRepository(OptionSearch) private readonly searches: Repository<OptionSearch>,
    @InjectRepository(Brief) private readonly briefs: Repository<Brief>,
    private readonly writes: WriteQueue,
    private readonly audit: AuditService,
    private readonly runner: SearchRunner,
    private readonly clock: Clock,
  ) {}

  /** @throws ProblemError 404 for an unknown brief, 409 while a search of the same person is unfinished */
  async start(brief: string, user: SignedInUser): Promise<SearchDto> {
    const briefId = rowId(brief, 'brief');
    const search = await this.writes.run(async (manager) => {
      const found = await manager.findOneBy(Brief, { id: briefId });
      if (!found) throw notFound('brief', brief);
      await refuseSecondSearch(manager, user);
      const created = await manager.save(OptionSearch, {
        briefId,
        briefVersion: found.version,
        state: 'queued' as const,
        request: found.requirement,
        outcome: null,
        optionCount: null,
        complete: null,
        message: null,
        startedById: user.id,
        startedAt: this.clock.iso(),
        finishedAt: null,
      });
      await this.audit.record(manager, {
        actor: user,
        action: 'search started',
        entity: 'brief',
        entityId: found.code,
        summary: `Search started for ${found.code}`,
        after: { searchId: String(created.id), briefVersion: found.version },
      });
      return created;
    });
    const summary: SearchSummaryDto = { ...toSearchSummary(search), by: user.name };
    this.runner.launch(search, summary, user);
    return { ...toSearchDto(search, null), by: user.name };
  }

  /** The latest searches of a brief, newest first. @throws ProblemError 404 */
  async ofBrief(brief: string): Promise<SearchSummaryDto[]> {
    const briefId = rowId(brief, 'brief');
    if (!(await this.briefs.existsBy({ id: briefId }))) throw notFound('brief', brief);
    const found = await this.searches.find({
      select: SUMMARY_COLUMNS,
      where: { briefId },
      relations: { startedBy: true },
      order: { id: 'DESC' },
      take: LISTED_SEARCHES,
    });
    return found.map(toSearchSummary);
  }

  /** The latest search of each of the briefs, by brief; one query however many there are. */
  async latestOf(briefIds: number[]): Promise<Map<number, SearchSummaryDto>> {
    if (briefIds.length === 0) return new Map();
    const latest = await this.searches
      .createQueryBuilder('search')
      .select('MAX(search.id)', 'id')
      .where('search.briefId IN (:...briefIds)', { briefIds })
      .groupBy('search.briefId')
      .getRawMany<{ id: number }>();
    const found = await this.searches.find({
      select: SUMMARY_COLUMNS,
      where: { id: In(latest.map(({ id }) => id)) },
      relations: { startedBy: true },
    });
    return new Map(found.map((search) => [search.briefId, toSearchSummary(search)]));
  }

  /** @throws ProblemError 404 */
  async get(id: string): Promise<SearchDto> {
    const search = await this.load(id);
    return toSearchDto(search, this.runner.find(search.id)?.progress ?? null);
  }

  /** The search with its outcome. @throws ProblemError 404 */
  async load(id: string): Promise<OptionSearch> {
    const where = { id: rowId(id, 'search') };
    const search = await this.searches.findOne({ where, relations: { startedBy: true } });
    if (!search) throw notFound('search', id);
    return search;
  }

  /** State and progress as they come; ends when the search has ended. @throws ProblemError 404 */
  async events(id: string): Promise<Observable<MessageEvent>> {
    const live = this.runner.find(rowId(id, 'search'));
    if (live) return live.watch();
    return endedStream(toSearchSummary(await this.load(id)));
  }

  /** Asks a search to stop; one that has ended stays as it is. @throws ProblemError 404 */
  async stop(id: string, user: SignedInUser): Promise<SearchDto> {
    const live = this.runner.find(rowId(id, 'search'));
    if (live && !live.stopFlag.raised) {
      live.stopFlag.raise();
      await this.writes.run(async (manager) => {
        const brief = await manager.findOneByOrFail(Brief, { id: Number(live.summary.briefId) });
        await this.audit.record(manager, {
          actor: user,
          action: 'asked to stop',
          entity: 'brief',
          entityId: brief.code,
          summary: `Asked the search of ${brief.code} to stop`,
          after: { searchId: id },
        });
      });
    }
    return this.get(id);
  }
}

async function refuseSecondSearch(manager: EntityManager, user: SignedInUser): Promise<void> {
  const running = await manager.findOne(OptionSearch, {
    select: { id: true, briefId: true, brief: { id: true, code: true, title: true } },
    where: { startedById: user.id, state: In([...UNFINISHED_STATES]) },
    relations: { brief: true },
  });
  if (!running) return;
  const name = `${running.brief?.code ?? ''} “${running.brief?.title ?? ''}”`;
  throw conflict(
    'search-running',
    `Your search for ${name} is still running. Wait until it is done, or stop it on that brief, then search again.`,
    { searchId: String(running.id), briefId: String(running.briefId) },
  );
}
