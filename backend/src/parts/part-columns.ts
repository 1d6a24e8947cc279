import type { AttributesOf, PartAttributes } from './dto/attributes/part-attributes.js';
import type { Part } from './entities/part.entity.js';
import type { PartKind } from './part-kinds.js';

type IndexColumns = Pick<
  Part,
  | 'teeth'
  | 'module'
  | 'pressureAngleDeg'
  | 'helixAngleDeg'
  | 'hand'
  | 'profileShift'
  | 'faceWidth'
  | 'bore'
  | 'shaftDiameter'
  | 'length'
  | 'width'
  | 'height'
>;

const NOTHING: IndexColumns = {
  teeth: null,
  module: null,
  pressureAngleDeg: null,
  helixAngleDeg: null,
  hand: null,
  profileShift: null,
  faceWidth: null,
  bore: null,
  shaftDiameter: null,
  length: null,
  width: null,
  height: null,
};

/** The attributes that lists filter and sort by, and that kits look up, as columns of the part table. */
export function indexColumns(kind: PartKind, attributes: PartAttributes): IndexColumns {
  const given: Partial<IndexColumns> = COLUMNS[kind](attributes);
  return { ...NOTHING, ...given };
}

type ColumnsOf = (attributes: PartAttributes) => Partial<IndexColumns>;

/** Ties a mapping for one kind to the table of all kinds: the caller pairs kind and attributes. */
const of =
  <K extends PartKind>(map: (attributes: AttributesOf<K>) => Partial<IndexColumns>): ColumnsOf =>
  (attributes) =>
    map(attributes as AttributesOf<K>);

const toothed = (a: AttributesOf<'gear' | 'pinion-shaft'>): Partial<IndexColumns> => ({
  teeth: a.teeth,
  module: a.module,
  pressureAngleDeg: a.pressureAngleDeg,
  helixAngleDeg: a.helixAngleDeg,
  hand: a.hand,
  profileShift: a.profileShift,
  faceWidth: a.faceWidth,
});

const COLUMNS: Record<PartKind, ColumnsOf> = {
  gear: of<'gear'>((a) => ({ ...toothed(a), bore: a.bore })),
  'pinion-shaft': of<'pinion-shaft'>((a) => ({
    ...toothed(a),
    shaftDiameter: a.shaftDiameter,
    length: a.shaftLength,
  })),
  shaft: of<'shaft'>((a) => ({ shaftDiameter: a.diameter, length: a.length })),
  bearing: of<'bearing'>((a) => ({ bore: a.bore, width: a.width })),
  key: of<'key'>((a) => ({ width: a.width, height: a.height, length: a.length })),
  'retaining-ring': of<'retaining-ring'>((a) => ({ shaftDiameter: a.shaftDiameter })),
  seal: of<'seal'>((a) => ({ shaftDiameter: a.shaftDiameter, width: a.width })),
  housing: of<'housing'>((a) => ({ length: a.length, width: a.width, height: a.height })),
  fastener: of<'fastener'>((a) => ({ length: a.length })),
  lubricant: () => ({}),
  other: () => ({}),
};
