import { Injectable } from '@nestjs/common';
import { type EntityManager } from 'typeorm';
import { badInput } from '../common/errors.js';
import { Part } from './entities/part.entity.js';
import { type PartStanding } from './part-kinds.js';

/** Longest chain of successors that is followed; a longer one is refused as if it were a circle. */
const LONGEST_CHAIN = 100;

/** Rules about the part to use instead of a withdrawn one. */
@Injectable()
export class PartSuccessors {
  /**
   * The successor as it is stored: the other part's own spelling, or null.
   * @throws ProblemError 400 naming `successorNumber` when the part is not withdrawn, the other does not exist, is the
   * part itself, or leads back to it
   */
  async check(
    manager: EntityManager,
    part: Part,
    standing: PartStanding,
    asked: string | null,
  ): Promise<string | null> {
    if (asked === null) return null;
    const refuse = (message: string) => badInput([{ field: 'successorNumber', value: asked, message }]);
    if (standing !== 'withdrawn') {
      throw refuse('Only a withdrawn part has a successor. Withdraw the part, or leave the successor empty.');
    }
    const successor = await manager.findOneBy(Part, { number: asked });
    if (!successor) {
      throw refuse(`There is no part “${asked}”. Add it first, or name one that exists.`);
    }
    if (successor.id === part.id) throw refuse('A part cannot follow itself. Name another part.');
    await this.refuseCircle(manager, part, successor, refuse);
    return successor.number;
  }

  private async refuseCircle(
    manager: EntityManager,
    part: Part,
    successor: Part,
    refuse: (message: string) => Error,
  ): Promise<void> {
    const chain = [part.number, successor.number];
    let follower: Part | null = successor;
    while (follower?.successorNumber) {
      const next: string = follower.successorNumber;
      chain.push(next);
      follower = await manager.findOneBy(Part, { number: next });
      if (follower?.id === part.id || chain.length > LONGEST_CHAIN) {
        throw refuse(
          `That would go round in a circle: ${chain.slice(0, 6).join(' → ')}. Name a part outside it.`,
        );
      }
    }
  }
}
