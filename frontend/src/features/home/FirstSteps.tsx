import Box from '@mui/material/Box';
import { Sheet } from '../../components/Sheet';
import { MoreLink } from './MoreLink';

const STEPS = [
  {
    to: '/people',
    name: 'Add the people of your team',
    why: 'Each gets a first password from you, and roles that say what they may do.',
  },
  {
    to: '/add-part',
    name: 'Add the gears that you hold or can buy',
    why: 'A search prefers them; bearings, keys and seals fill the bill of materials.',
  },
  {
    to: '/add-supplier',
    name: 'Add your suppliers, then their price lists',
    why: 'Paste them from a spreadsheet; trains then show what they cost.',
  },
  {
    to: '/briefs/new',
    name: 'Write the first brief',
    why: 'The ratio, the room and the duty; its search shows every sensible train.',
  },
] as const;

/** What to do on an empty server, in order. */
export function FirstSteps() {
  return (
    <Sheet title="To begin with">
      <Box component="ol" sx={{ m: 0, pl: 2.5, display: 'flex', flexDirection: 'column', gap: 1 }}>
        {STEPS.map(({ to, name, why }) => (
          <li key={to}>
            <MoreLink to={to} text={name} />
            <Box sx={{ color: 'text.secondary' }}>{why}</Box>
          </li>
        ))}
      </Box>
    </Sheet>
  );
}
