import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { Link } from 'react-router-dom';
import { Sheet } from '../../../components/Sheet';
import { PartLink } from '../PartLink';
import type { PricedLine } from './pricedLine';

interface UnpricedLinesProps {
  lines: readonly PricedLine[];
  mayAddOffers: boolean;
  mayEdit: boolean;
  onSubstitutes: (line: PricedLine) => void;
}

const WHY: Record<'made' | 'no-part' | 'no-offers' | 'none-valid', string> = {
  made: 'is made here',
  'no-part': 'has no part yet: what it is still has to be chosen',
  'no-offers': 'is offered by nobody here',
  'none-valid': 'has offers, but none that is valid today',
};

/** Lines to be bought that no total holds: which, why, and the next step. */
export function UnpricedLines({ lines, mayAddOffers, mayEdit, onSubstitutes }: UnpricedLinesProps) {
  if (lines.length === 0) return null;
  const title = lines.length === 1 ? '1 line without a price' : `${lines.length} lines without a price`;
  return (
    <Sheet title={title} sx={{ mt: 2 }}>
      <Box component="ul" sx={listSx}>
        {lines.map((each) => {
          const { line, priced } = each;
          const reason = priced?.reason ?? 'no-offers';
          const number = line.partNumber;
          return (
            <Box component="li" key={line.key} sx={itemSx}>
              <span>
                {`Find ${line.findNumber}: `}
                {number === null ? line.description : <PartLink number={number} />}
                {` ${WHY[reason]}.`}
                {number === null && !mayEdit && ' A designer can choose it.'}
              </span>
              {number !== null && mayAddOffers && (
                <Button
                  variant="text"
                  component={Link}
                  to={`/add-offer?part=${encodeURIComponent(number)}`}
                  sx={buttonSx}
                >
                  Add an offer
                </Button>
              )}
              {mayEdit && line.extraLineId === null && (
                <Button variant="text" onClick={() => onSubstitutes(each)} sx={buttonSx}>
                  {number === null ? 'Choose a part' : 'Look for a substitute'}
                </Button>
              )}
            </Box>
          );
        })}
      </Box>
    </Sheet>
  );
}

/** What stands on single lines and wants a look before anything is ordered. */
export function LookAtList({ lines }: { lines: readonly PricedLine[] }) {
  const marked = lines.filter(({ line }) => line.flags.length > 0);
  if (marked.length === 0) return null;
  return (
    <Sheet title="Look at before ordering" sx={{ mt: 2 }}>
      <Box component="ul" sx={listSx}>
        {marked.map(({ line }) => (
          <Box component="li" key={line.key} sx={itemSx}>
            <span>
              {`Find ${line.findNumber}: `}
              {line.partNumber === null ? line.description : <PartLink number={line.partNumber} />}
              {` · ${line.flags.join(' · ')}`}
            </span>
          </Box>
        ))}
      </Box>
    </Sheet>
  );
}

const listSx = { listStyle: 'none', m: 0, p: 0 } as const;
const itemSx = { display: 'flex', flexWrap: 'wrap', alignItems: 'baseline', columnGap: 1, py: 0.25 } as const;
const buttonSx = { minHeight: 26, py: 0, displayPrint: 'none' } as const;
