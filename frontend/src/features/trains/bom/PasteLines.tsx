import { useRef } from 'react';
import { bookBomPaste, previewBomPaste } from '../../../api/hooks/useBomEdits';
import { asProblem } from '../../../api/problem';
import type { BomPastePreview, Train } from '../../../api/types';
import { PasteDialog } from '../../../components/paste/PasteDialog';

const HELP = {
  columns: [
    { name: 'Find number', hint: 'the line whose part is chosen; blank for a line that is added' },
    { name: 'Part number', hint: 'a cleared part of the library' },
    { name: 'Quantity', hint: 'in each train' },
    { name: 'Unit', hint: 'pcs, l or m; that of the part where it is blank' },
    { name: 'Description', hint: 'what it is, where there is no part number' },
    { name: 'Note', hint: 'anything worth knowing' },
  ],
  example: [
    ['Find number', 'Part number', 'Quantity', 'Unit', 'Description', 'Note'],
    ['', '', '2', 'pcs', 'Lifting eye M8', 'for the crane'],
  ],
};

interface PasteLinesProps {
  train: Train;
  onBooked: () => void;
  onClose: () => void;
}

/** Rows from a spreadsheet into the bill: parts for its lines, and lines that are added. */
export function PasteLines({ train, onBooked, onClose }: PasteLinesProps) {
  // The version of the train that the last preview looked at; it goes back with the booking.
  const seen = useRef<BomPastePreview | null>(null);

  async function preview(text: string): Promise<BomPastePreview> {
    const answer = await previewBomPaste(train.code, text);
    seen.current = answer;
    return answer;
  }

  async function book(text: string, token: string, leaveOutWrong: boolean): Promise<string> {
    const version = seen.current?.version ?? train.version;
    try {
      const booked = await bookBomPaste(train.code, text, { token, version }, leaveOutWrong);
      return bookedWords(booked);
    } catch (error) {
      const problem = asProblem(error);
      if (problem.code === 'preview-outdated') seen.current = problem.current as BomPastePreview;
      throw problem;
    }
  }

  return (
    <PasteDialog
      title={`Paste rows into the bill of ${train.code}`}
      columnsHelp={HELP}
      preview={preview}
      book={book}
      onBooked={onBooked}
      onClose={onClose}
    />
  );
}

/** `2 lines changed, 1 added.` */
function bookedWords({ chosen, added, leftOut }: { chosen: number; added: number; leftOut: number }): string {
  const said = [
    chosen > 0 && `${chosen} ${chosen === 1 ? 'line' : 'lines'} changed`,
    added > 0 && `${added} ${added === 1 ? 'line' : 'lines'} added`,
    leftOut > 0 && `${leftOut} ${leftOut === 1 ? 'row' : 'rows'} left out`,
  ].filter(Boolean);
  return said.length === 0 ? 'Nothing to book: everything stands as pasted.' : `${said.join(', ')}.`;
}
