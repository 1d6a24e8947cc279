import { useNavigate, useSearchParams } from 'react-router-dom';
import { answer, api } from '../../api/client';
import { useMe } from '../../api/hooks/useMe';
import type { PartKind } from '../../api/types';
import { NoPermission } from '../../components/NoPermission';
import { useNotices } from '../../components/Notices';
import { PageHeader } from '../../components/PageHeader';
import { useRefreshParts } from './useRefreshParts';
import { PartEditor } from './PartEditor';
import { inputOf, newPartForm, type PartForm } from './partForm';
import { PART_KINDS } from './partKinds';

export default function AddPartPage() {
  const navigate = useNavigate();
  const [params] = useSearchParams();
  const { can } = useMe();
  const { tell } = useNotices();
  const refresh = useRefreshParts();
  const asked = params.get('kind');
  const kind: PartKind = PART_KINDS.find((each) => each === asked) ?? 'gear';

  const save = async (form: PartForm) => {
    const part = await answer(api.POST('/api/parts', { body: inputOf(form) }));
    refresh();
    tell(`${part.number} added.`);
    return () => void navigate(`/parts/${encodeURIComponent(part.number)}`, { replace: true });
  };

  if (!can('parts.edit')) {
    return (
      <>
        <PageHeader title="Add a part" />
        <NoPermission message="Adding parts needs the librarian’s role. You can look parts up." />
      </>
    );
  }
  return (
    <>
      <PageHeader title="Add a part" />
      <PartEditor
        start={newPartForm(kind)}
        onSave={save}
        onCancel={() => void navigate('/parts')}
        saveName="Add the part"
      />
    </>
  );
}
