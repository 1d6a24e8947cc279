import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { answer, api } from '../../api/client';
import { asProblem } from '../../api/problem';
import type { User } from '../../api/types';
import { ConfirmDialog } from '../../components/ConfirmDialog';
import { CopyTable } from '../../components/CopyTable';
import { formatDay } from '../../components/figures';
import { useNotices } from '../../components/Notices';
import { roleWords } from './roleNames';

interface PeopleTableProps {
  users: readonly User[];
  myId: string;
  onEdit: (user: User) => void;
  onChanged: () => void;
}

export function PeopleTable({ users, myId, onEdit, onChanged }: PeopleTableProps) {
  const { tell } = useNotices();
  const [leaving, setLeaving] = useState<User | null>(null);

  const setActive = async (user: User, active: boolean) => {
    try {
      const body = { version: user.version, active };
      await answer(api.PATCH('/api/users/{id}', { params: { path: { id: user.id } }, body }));
      tell(active ? `${user.name} can sign in again.` : `${user.name} can no longer sign in.`);
    } catch (error) {
      tell(asProblem(error).message);
    }
    setLeaving(null);
    onChanged();
  };

  return (
    <TableContainer>
      <CopyTable label="People">
        <TableHead>
          <TableRow>
            <TableCell>Name</TableCell>
            <TableCell sx={WIDE}>E-mail address</TableCell>
            <TableCell>Roles</TableCell>
            <TableCell sx={WIDE}>State</TableCell>
            <TableCell align="right" sx={WIDE}>
              Since
            </TableCell>
            <TableCell align="right">Actions</TableCell>
          </TableRow>
        </TableHead>
        <TableBody>
          {users.map((user) => (
            <TableRow key={user.id} hover>
              <TableCell sx={{ fontWeight: 500, overflowWrap: 'anywhere' }}>
                {user.name}
                {user.id === myId && (
                  <Box component="span" sx={quietSx}>
                    {' (you)'}
                  </Box>
                )}
                <Box sx={{ ...quietSx, display: { sm: 'none' } }}>{user.email}</Box>
              </TableCell>
              <TableCell sx={{ ...WIDE, overflowWrap: 'anywhere' }}>{user.email}</TableCell>
              <TableCell>
                {roleWords(user.roles)}
                {!user.active && <Box sx={{ ...quietSx, display: { sm: 'none' } }}>switched off</Box>}
              </TableCell>
              <TableCell sx={WIDE}>{user.active ? 'active' : 'switched off'}</TableCell>
              <TableCell align="right" sx={WIDE}>
                {formatDay(user.createdAt)}
              </TableCell>
              <TableCell align="right" sx={{ whiteSpace: { sm: 'nowrap' } }}>
                <Button onClick={() => onEdit(user)} aria-label={`Edit ${user.name}`}>
                  Edit
                </Button>
                {user.id !== myId &&
                  (user.active ? (
                    <Button
                      color="error"
                      onClick={() => setLeaving(user)}
                      aria-label={`Switch off ${user.name}`}
                    >
                      Switch off
                    </Button>
                  ) : (
                    <Button onClick={() => void setActive(user, true)} aria-label={`Switch on ${user.name}`}>
                      Switch on
                    </Button>
                  ))}
              </TableCell>
            </TableRow>
          ))}
        </TableBody>
      </CopyTable>
      <ConfirmDialog
        open={leaving !== null}
        title={`Switch off ${leaving?.name ?? ''}?`}
        confirm="Switch off"
        danger
        onConfirm={() => leaving && void setActive(leaving, false)}
        onCancel={() => setLeaving(null)}
      >
        <Typography>
          Every session of this person ends at once and they cannot sign in. What they wrote stays. You can
          switch them on again.
        </Typography>
      </ConfirmDialog>
    </TableContainer>
  );
}

/** On a narrow screen these stand under the name and the roles. */
const WIDE = { display: { xs: 'none', sm: 'table-cell' } } as const;
const quietSx = { fontWeight: 400, color: 'text.secondary' } as const;
