import { useLocation, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { useBrief } from '../../api/hooks/useBrief';
import { useMe } from '../../api/hooks/useMe';
import { asProblem } from '../../api/problem';
import type { Requirement } from '../../api/types';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { NoPermission } from '../../components/NoPermission';
import { BriefOverview } from './BriefOverview';
import { BriefFormView } from './form/BriefFormView';

/** `/briefs/new` and `/briefs/:id`: results first, the form behind “Edit brief”. */
export default function BriefPage() {
  const { id = '' } = useParams();
  return id === 'new' ? <NewBrief /> : <SavedBrief key={id} id={id} />;
}

function NewBrief() {
  const navigate = useNavigate();
  const { me, can } = useMe();
  if (me && !can('briefs.edit')) {
    return <NoPermission message="Briefs are written by designers. You can read every brief under Briefs." />;
  }
  return (
    <BriefFormView
      brief={null}
      onSaved={(brief) => void navigate(`/briefs/${encodeURIComponent(brief.id)}`, { replace: true })}
      onLeave={() => void navigate('/briefs')}
    />
  );
}

function SavedBrief({ id }: { id: string }) {
  const { data: brief, error, mutate } = useBrief(id);
  const { can } = useMe();
  const [params] = useSearchParams();
  const navigate = useNavigate();
  const location = useLocation();
  if (!brief) {
    if (error === undefined) return <LoadingRows rows={14} label="Loading the brief" />;
    return <ErrorState problem={asProblem(error)} what="the brief" onRetry={() => void mutate()} />;
  }
  const home = `/briefs/${encodeURIComponent(brief.id)}`;
  if (params.has('edit') && can('briefs.edit')) {
    return (
      <BriefFormView
        brief={brief}
        change={(location.state as { change?: Partial<Requirement> } | null)?.change}
        onSaved={() => void navigate(home)}
        onLeave={() => void navigate(home)}
      />
    );
  }
  return <BriefOverview brief={brief} />;
}
