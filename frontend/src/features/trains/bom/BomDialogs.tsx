import type { Prefer } from '../../../api/hooks/useTrainPrices';
import type { Bom, Train } from '../../../api/types';
import { ExtraLineDialog } from './ExtraLineDialog';
import type { LineAct } from './LineMenu';
import { OffersDialog } from './OffersDialog';
import { PasteLines } from './PasteLines';
import type { PricedLine } from './pricedLine';
import { SwapDialog } from './SwapDialog';

/** Which dialog stands open, and for which line. */
export type OpenDialog = { act: Exclude<LineAct, 'remove'>; line: PricedLine } | { act: 'add' | 'paste' };

interface BomDialogsProps {
  open: OpenDialog;
  train: Train;
  bom: Bom;
  prefer: Prefer;
  canEdit: boolean;
  canChoose: boolean;
  onClose: () => void;
}

/** The one dialog that is open over the bill of materials. */
export function BomDialogs({ open, train, bom, prefer, canEdit, canChoose, onClose }: BomDialogsProps) {
  if (open.act === 'paste') return <PasteLines train={train} onBooked={() => undefined} onClose={onClose} />;
  if (!('line' in open)) {
    return <ExtraLineDialog train={train} extraLines={bom.extraLines} line={null} onClose={onClose} />;
  }
  const { line, priced } = open.line;
  const needed = priced?.needed ?? line.quantity * train.buildQuantity;
  if (open.act === 'edit') {
    const extra = bom.extraLines.find(({ id }) => id === line.extraLineId) ?? null;
    return <ExtraLineDialog train={train} extraLines={bom.extraLines} line={extra} onClose={onClose} />;
  }
  if (open.act === 'substitutes') {
    return <SwapDialog train={train} line={line} needed={needed} canSwap={canEdit} onClose={onClose} />;
  }
  if (line.partNumber === null) return null;
  const chosen = train.offerChoices.find(({ partNumber }) => partNumber === line.partNumber);
  return (
    <OffersDialog
      train={train}
      part={{ number: line.partNumber, description: line.description, needed, unit: line.unit }}
      chosenId={chosen?.offerId ?? null}
      prefer={prefer}
      canChoose={canChoose}
      onClose={onClose}
    />
  );
}
