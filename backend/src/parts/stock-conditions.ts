import { type GearNeed, type PartNeed, type PinionShaftNeed } from '@stageyard/libs/bill-of-materials';
import { type SelectQueryBuilder } from 'typeorm';
import { type Part } from './entities/part.entity.js';

/** Sizes in mm and coefficients that differ by less than this are the same; stored figures come from decimals. */
const SAME = 1e-6;

/** Narrows a query over parts (alias `part`) to those that meet the need, the best first. */
export function narrowToNeed(rows: SelectQueryBuilder<Part>, need: PartNeed): void {
  const equal = (column: string, value: number) =>
    rows.andWhere(`part.${column} BETWEEN :${column}Low AND :${column}High`, {
      [`${column}Low`]: value - SAME,
      [`${column}High`]: value + SAME,
    });
  const atLeast = (column: string, value: number) =>
    rows
      .andWhere(`part.${column} >= :${column}Least`, { [`${column}Least`]: value - SAME })
      .addOrderBy(`part.${column}`, 'ASC');
  switch (need.kind) {
    case 'gear':
      toothed(rows, need, equal);
      equal('bore', need.bore);
      atLeast('faceWidth', need.faceWidth);
      break;
    case 'pinion-shaft':
      toothed(rows, need, equal);
      equal('shaftDiameter', need.shaftDiameter);
      atLeast('faceWidth', need.faceWidth);
      atLeast('length', need.shaftLength);
      break;
    case 'shaft':
      equal('shaftDiameter', need.diameter);
      atLeast('length', need.length);
      break;
    case 'bearing':
      equal('bore', need.bore);
      break;
    case 'key':
      equal('width', need.width);
      equal('height', need.height);
      equal('length', need.length);
      break;
    case 'retaining-ring':
    case 'seal':
      equal('shaftDiameter', need.shaftDiameter);
      break;
    case 'housing':
      for (const side of ['length', 'width', 'height'] as const) atLeast(side, need[side]);
      rows.andWhere(`json_extract(part.attributes, '$.wall') >= :wall`, { wall: need.wall - SAME });
      break;
    case 'lubricant':
      rows.andWhere(`json_extract(part.attributes, '$.viscosityGrade') = :grade COLLATE NOCASE`, {
        grade: need.viscosityGrade,
      });
      break;
  }
}

/** Teeth match exactly; a shift that the maker does not state counts as 0, and a stated one comes first. */
function toothed(
  rows: SelectQueryBuilder<Part>,
  need: GearNeed | PinionShaftNeed,
  equal: (column: string, value: number) => void,
): void {
  rows.andWhere('part.teeth = :teeth', { teeth: need.teeth });
  equal('module', need.module);
  equal('pressureAngleDeg', need.pressureAngleDeg);
  equal('helixAngleDeg', need.helixAngleDeg);
  if (need.hand && need.helixAngleDeg > 0) rows.andWhere('part.hand = :hand', { hand: need.hand });
  rows
    .andWhere('COALESCE(part.profileShift, 0) BETWEEN :shiftLow AND :shiftHigh', {
      shiftLow: need.profileShift - SAME,
      shiftHigh: need.profileShift + SAME,
    })
    .addOrderBy('part.profileShift IS NULL', 'ASC');
}
