import WarningAmber from '@mui/icons-material/WarningAmberOutlined';
import Box from '@mui/material/Box';
import type { Substitute } from '../../api/types';
import { arrivalWords, offerWords, onShelfWords } from './substituteWords';

/** One part that drops in, as a choice: when it is there, what it costs, where it differs, what to look at. */
export function SubstituteLine({ substitute }: { substitute: Substitute }) {
  const { part, differences, toCheck, successor } = substitute;
  return (
    <Box sx={{ py: 0.5, minWidth: 0 }}>
      <Box sx={{ display: 'flex', justifyContent: 'space-between', gap: 2 }}>
        <span>
          <span className="part-number">{part.number}</span>{' '}
          <Box component="span" sx={{ color: 'text.secondary' }}>
            {part.description}
            {successor && ' · named as the successor'}
          </Box>
        </span>
        <Box component="span" sx={{ fontWeight: 600, whiteSpace: 'nowrap' }}>
          {arrivalWords(substitute)}
        </Box>
      </Box>
      <Box sx={{ color: 'text.secondary', fontSize: '0.8125rem' }}>
        {[offerWords(substitute), onShelfWords(substitute), ...differences].filter(Boolean).join(' · ')}
      </Box>
      <ToCheck toCheck={toCheck} />
    </Box>
  );
}

/** What the library cannot tell and a person must look at. */
export function ToCheck({ toCheck }: Pick<Substitute, 'toCheck'>) {
  if (toCheck.length === 0) return null;
  return (
    <Box sx={{ color: 'warning.main', fontSize: '0.8125rem', display: 'flex', gap: 0.5 }}>
      <WarningAmber titleAccess="To check" sx={{ fontSize: 15, mt: '2px', flexShrink: 0 }} />
      <span>{toCheck.join(' · ')}</span>
    </Box>
  );
}
