import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Link from '@mui/material/Link';
import { Link as RouterLink, useParams, useSearchParams } from 'react-router-dom';
import { answer, api } from '../../api/client';
import { useMe } from '../../api/hooks/useMe';
import { usePart } from '../../api/hooks/usePart';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { useNotices } from '../../components/Notices';
import { PageHeader } from '../../components/PageHeader';
import { PartChanges } from './PartChanges';
import { PartEditor } from './PartEditor';
import { PartFacts } from './PartFacts';
import { formOfPart, patchOf, type PartForm } from './partForm';
import { PartHeadFacts } from './PartHeadFacts';
import { PartOffers } from './PartOffers';
import { PartShelf } from './PartShelf';
import { PartSubstitutes } from './PartSubstitutes';
import { StandingActions } from './StandingActions';
import { useRefreshParts } from './useRefreshParts';

export default function PartPage() {
  const { number = '' } = useParams();
  const [params, setParams] = useSearchParams();
  const { can } = useMe();
  const { part, problem, mutate } = usePart(number);
  const { tell } = useNotices();
  const refresh = useRefreshParts();
  const editing = params.get('edit') === '1' && can('parts.edit');
  const showEdit = (on: boolean) => setParams(on ? { edit: '1' } : {}, { replace: !on });

  if (part === undefined) {
    if (problem !== null) {
      return (
        <>
          <PageHeader
            title={number}
            actions={
              <Link component={RouterLink} to="/parts">
                All parts
              </Link>
            }
          />
          <ErrorState problem={problem} onRetry={() => void mutate()} what={`part ${number}`} />
        </>
      );
    }
    return (
      <>
        <PageHeader title={number} />
        <LoadingRows rows={10} label="Loading the part" />
      </>
    );
  }

  const save = async (form: PartForm, version: number) => {
    const body = patchOf(form, version);
    const after = await answer(api.PATCH('/api/parts/{number}', { params: { path: { number } }, body }));
    await mutate(after, { revalidate: false });
    refresh();
    tell(`${part.number} saved.`);
    return () => showEdit(false);
  };

  if (editing) {
    return (
      <>
        <PageHeader code={part.number} title={part.description} facts="Editing" />
        <PartEditor
          key={part.id}
          part={part}
          start={formOfPart(part)}
          onSave={save}
          onCancel={() => showEdit(false)}
          saveName="Save changes"
        />
      </>
    );
  }
  return (
    <>
      <PageHeader
        code={part.number}
        title={part.description}
        facts={<PartHeadFacts part={part} />}
        actions={
          can('parts.edit') && (
            <>
              <StandingActions part={part} onChanged={(after) => void mutate(after, { revalidate: false })} />
              <Button variant="contained" onClick={() => showEdit(true)}>
                Edit
              </Button>
            </>
          )
        }
      />
      <PartFacts
        part={part}
        below={
          <Box sx={{ display: 'flex', flexDirection: 'column', gap: 2 }}>
            <PartOffers part={part} />
            <PartShelf number={part.number} />
            <PartSubstitutes part={part} />
            <PartChanges number={part.number} version={part.version} />
          </Box>
        }
      />
    </>
  );
}
