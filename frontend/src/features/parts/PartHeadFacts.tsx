import Link from '@mui/material/Link';
import { Link as RouterLink } from 'react-router-dom';
import type { Part } from '../../api/types';
import { formatWhen } from '../../components/figures';
import { KIND_NAMES } from './partKinds';
import { StandingWord } from './StandingWord';

/** One line under the part's name. */
export function PartHeadFacts({ part }: { part: Part }) {
  return (
    <>
      {KIND_NAMES[part.kind]} · <StandingWord standing={part.standing} />
      {part.successorNumber !== null && (
        <>
          , use{' '}
          <Link
            component={RouterLink}
            to={`/parts/${encodeURIComponent(part.successorNumber)}`}
            className="part-number"
          >
            {part.successorNumber}
          </Link>{' '}
          instead
        </>
      )}
      {` · changed ${formatWhen(part.updatedAt)} by ${part.updatedBy}`}
    </>
  );
}
