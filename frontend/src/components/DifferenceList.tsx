import Box from '@mui/material/Box';

/** One field that changed, in the words of the screens. */
export interface Difference {
  field: string;
  before: string;
  after: string;
}

/** "Mass, kg: 0.18 → 0.21", one line a field. */
export function DifferenceList({ differences }: { differences: readonly Difference[] }) {
  if (differences.length === 0) return null;
  return (
    <Box component="ul" sx={{ m: 0, p: 0, listStyle: 'none', fontSize: '0.8125rem' }}>
      {differences.map(({ field, before, after }) => (
        <Box component="li" key={field} sx={{ overflowWrap: 'anywhere' }}>
          <Box component="span" sx={{ color: 'text.secondary' }}>
            {field}:{' '}
          </Box>
          {before} <span aria-label="became">→</span> <b>{after}</b>
        </Box>
      ))}
    </Box>
  );
}
