import { type FitPlace, type SubstituteSizes } from '@stageyard/libs/bill-of-materials';
import { type SelectQueryBuilder } from 'typeorm';
import { type Part } from '../parts/entities/part.entity.js';

/** Figures that differ by less are the same; stored figures come from decimals. */
const SAME = 1e-6;

/**
 * Narrows a query over parts (alias `part`) to those that may drop in for the sizes. Every kind begins with equal
 * figures that an index serves (see the part entity); the rules of fit decide afterwards.
 */
export function narrowToCandidates(
  rows: SelectQueryBuilder<Part>,
  sizes: SubstituteSizes,
  place: FitPlace,
): void {
  const by = (condition: string, name: string, value: number | string) =>
    rows.andWhere(`${condition} :${name}`, { [name]: value });
  /** Served by the index of the kind and this column: both figures are the same decimal. */
  const exactly = (column: string, value: number) => by(`part.${column} =`, column, value);
  const near = (expression: string, name: string, value: number) => {
    by(`+${expression} >=`, `${name}Low`, value - SAME);
    by(`+${expression} <=`, `${name}High`, value + SAME);
  };
  // A plus keeps the database from walking the index of a wide range, which it takes for the shortest way.
  const atLeast = (column: string, value: number) => by(`+part.${column} >=`, `${column}Least`, value - SAME);
  const atMost = (column: string, value: number) => by(`+part.${column} <=`, `${column}Most`, value + SAME);
  rows.where(`part.kind = :kind AND +part.standing = 'cleared'`, { kind: sizes.kind });
  switch (sizes.kind) {
    case 'gear':
    case 'pinion-shaft':
      exactly('module', sizes.module);
      exactly('teeth', sizes.teeth);
      near('part.pressureAngleDeg', 'pressure', sizes.pressureAngleDeg);
      near('part.helixAngleDeg', 'helix', sizes.helixAngleDeg);
      near('COALESCE(part.profileShift, 0)', 'shift', sizes.profileShift ?? 0);
      atLeast('faceWidth', place.leastFaceWidth ?? sizes.faceWidth);
      if (place.mostFaceWidth !== undefined) atMost('faceWidth', place.mostFaceWidth);
      if (sizes.kind === 'gear') atMost('bore', place.shaftDiameter ?? sizes.bore);
      else exactly('shaftDiameter', sizes.shaftDiameter);
      break;
    case 'shaft':
      exactly('shaftDiameter', sizes.diameter);
      atLeast('length', sizes.length);
      break;
    case 'bearing':
      exactly('bore', sizes.bore);
      if (sizes.width !== null) near('part.width', 'width', sizes.width);
      break;
    case 'key':
      exactly('length', sizes.length);
      near('part.width', 'width', sizes.width);
      near('part.height', 'height', sizes.height);
      break;
    case 'retaining-ring':
    case 'seal':
      exactly('shaftDiameter', sizes.shaftDiameter);
      break;
    case 'housing':
      // A thicker wall asks for a larger outside, which the rules of fit see to.
      for (const side of ['length', 'width', 'height'] as const) atLeast(side, sizes[side]);
      break;
    case 'fastener':
      exactly('length', sizes.length);
      by(`json_extract(part.attributes, '$.thread') =`, 'thread', sizes.thread);
      break;
    case 'lubricant':
      rows.andWhere(`json_extract(part.attributes, '$.viscosityGrade') = :grade COLLATE NOCASE`, {
        grade: sizes.viscosityGrade,
      });
      break;
    case 'other':
      rows.andWhere('1 = 0');
  }
}
