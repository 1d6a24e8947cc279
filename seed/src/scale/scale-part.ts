import { type PartInputDto } from '@stageyard/backend/parts/dto/part-input.dto';

/** What the generators say of a part; standing and supplier come on top. */
export type ScalePart = Pick<PartInputDto, 'kind' | 'description' | 'attributes'> & {
  material: string | null;
  /** kg, of one piece or one litre */
  mass: number;
};
