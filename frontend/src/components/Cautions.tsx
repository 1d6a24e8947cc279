import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';

/** Short form beside results, and what the full text adds; also the words every export carries. */
export const CAUTION_SHORT =
  'Gear failures injure people. Results are for selection and comparison by a competent person; they are not a certified rating.';

export const CAUTION_REST = [
  'Final design, guarding, and the loads assumed are for licensed or otherwise authorised engineers under local codes (machinery safety law, ISO 12100, lifting and hoisting rules where a load hangs on the train).',
  'Not covered: dynamic shock, shaft bending, bearing life, lubrication failure, thermal rating.',
  'Tooth strength is not rated here yet.',
];

/** The cautions, wherever results are shown. `short` folds the rest behind a summary. */
export function Cautions({ short = false }: { short?: boolean }) {
  const rest = CAUTION_REST.map((text) => (
    <Typography key={text} variant="body2" sx={{ mt: 0.5 }}>
      {text}
    </Typography>
  ));
  return (
    <Box component="aside" aria-label="Cautions" sx={{ color: 'text.secondary', maxWidth: 760, mt: 1.5 }}>
      <Typography variant="body2">{CAUTION_SHORT}</Typography>
      {short ? (
        <Box component="details" sx={{ '& summary': { cursor: 'pointer', fontSize: '0.8125rem', mt: 0.5 } }}>
          <summary>What is not covered, and who decides</summary>
          {rest}
        </Box>
      ) : (
        rest
      )}
    </Box>
  );
}
