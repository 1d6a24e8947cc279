import Box from '@mui/material/Box';
import type { CheckTally } from './trainWords';

/** `1 check fails, 2 marginal, 20 pass, 3 findings`: the words carry it, the colour only underlines. */
export function TallyWords({ tally }: { tally: CheckTally }) {
  const { fails, marginal, passes, findings } = tally;
  const parts = [
    fails > 0 && { words: `${fails} ${fails === 1 ? 'check fails' : 'checks fail'}`, colour: 'error.main' },
    marginal > 0 && { words: `${marginal} marginal`, colour: 'warning.main' },
    { words: `${passes} ${passes === 1 ? 'passes' : 'pass'}`, colour: undefined },
    findings > 0 && {
      words: `${findings} ${findings === 1 ? 'finding' : 'findings'}`,
      colour: 'warning.main',
    },
  ].filter((part) => part !== false);
  return (
    <>
      {parts.map(({ words, colour }, index) => (
        <span key={words}>
          {index > 0 && ', '}
          <Box component="span" sx={{ color: colour, fontWeight: colour ? 600 : 400 }}>
            {words}
          </Box>
        </span>
      ))}
    </>
  );
}
