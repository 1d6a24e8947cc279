import Button from '@mui/material/Button';
import { useState } from 'react';
import { useMe } from '../../api/hooks/useMe';
import { useUsers } from '../../api/hooks/useUsers';
import type { User } from '../../api/types';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { NoPermission } from '../../components/NoPermission';
import { useNotices } from '../../components/Notices';
import { PageHeader } from '../../components/PageHeader';
import { Sheet } from '../../components/Sheet';
import { PeopleTable } from './PeopleTable';
import { PersonDialog } from './PersonDialog';

/** Who may enter, and what they may do. */
export default function PeoplePage() {
  const { me, can } = useMe();
  const allowed = can('people.manage');
  const { users, problem, mutate } = useUsers(allowed);
  const { tell } = useNotices();
  const [edited, setEdited] = useState<User | 'new' | null>(null);
  if (!allowed) {
    return (
      <>
        <PageHeader title="People" />
        <NoPermission message="Only administrators manage people and roles." />
      </>
    );
  }
  return (
    <>
      <PageHeader
        title="People"
        facts="What a person may do is what any of their roles gives."
        actions={
          <Button variant="contained" onClick={() => setEdited('new')}>
            Add a person
          </Button>
        }
      />
      <Sheet flush>
        {users === undefined && problem !== null && (
          <ErrorState problem={problem} onRetry={() => void mutate()} what="the people" />
        )}
        {users === undefined && problem === null && <LoadingRows rows={5} label="Loading the people" />}
        {users !== undefined && (
          <PeopleTable users={users} myId={me?.id ?? ''} onEdit={setEdited} onChanged={() => void mutate()} />
        )}
      </Sheet>
      {edited !== null && (
        <PersonDialog
          person={edited === 'new' ? null : edited}
          onClose={() => setEdited(null)}
          onSaved={(message) => {
            setEdited(null);
            tell(message);
            void mutate();
          }}
        />
      )}
    </>
  );
}
