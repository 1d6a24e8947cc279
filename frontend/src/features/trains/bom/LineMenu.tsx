import MoreVert from '@mui/icons-material/MoreVert';
import IconButton from '@mui/material/IconButton';
import Menu from '@mui/material/Menu';
import MenuItem from '@mui/material/MenuItem';
import { useId, useState } from 'react';
import { Link } from 'react-router-dom';
import type { PricedLine } from './pricedLine';

/** What is opened for a line. */
export type LineAct = 'offers' | 'substitutes' | 'edit' | 'remove';

interface LineMenuProps {
  line: PricedLine;
  /** Offers can be chosen. */
  mayChoose: boolean;
  /** Parts and added lines can be changed. */
  mayEdit: boolean;
  onAct: (act: LineAct) => void;
}

/** Everything that can be done with one line of the bill. */
export function LineMenu({ line: { line, priced }, mayChoose, mayEdit, onAct }: LineMenuProps) {
  const [anchor, setAnchor] = useState<HTMLElement | null>(null);
  const id = useId();
  const number = line.partNumber;
  const added = line.extraLineId !== null;
  const act = (what: LineAct) => () => {
    setAnchor(null);
    onAct(what);
  };
  const others = priced?.otherOffers ?? 0;
  if (number === null && !mayEdit) return null;
  return (
    <>
      <IconButton
        aria-label={`What to do with line ${line.findNumber}`}
        aria-haspopup="menu"
        aria-controls={anchor ? id : undefined}
        aria-expanded={anchor !== null}
        onClick={(event) => setAnchor(event.currentTarget)}
        sx={{ p: 0.25, displayPrint: 'none' }}
      >
        <MoreVert sx={{ fontSize: 18 }} />
      </IconButton>
      <Menu
        id={id}
        anchorEl={anchor}
        open={anchor !== null}
        onClose={() => setAnchor(null)}
        // Clicks in the menu are not clicks on the row it belongs to.
        onClick={(event) => event.stopPropagation()}
      >
        {number !== null && priced !== null && (
          <MenuItem onClick={act('offers')}>
            {mayChoose ? 'Choose the offer' : 'See the offers'}
            {others > 0 && ` (${others === 1 ? '1 other' : `${others} others`})`}
          </MenuItem>
        )}
        {!added && (
          <MenuItem onClick={act('substitutes')}>{mayEdit ? 'Substitutes and swap' : 'Substitutes'}</MenuItem>
        )}
        {number !== null && (
          <MenuItem component={Link} to={`/parts/${encodeURIComponent(number)}`}>
            {`Page of ${number}`}
          </MenuItem>
        )}
        {added && mayEdit && <MenuItem onClick={act('edit')}>Change this added line</MenuItem>}
        {added && mayEdit && <MenuItem onClick={act('remove')}>Take this line away</MenuItem>}
      </Menu>
    </>
  );
}
