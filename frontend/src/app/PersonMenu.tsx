import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Menu from '@mui/material/Menu';
import MenuItem from '@mui/material/MenuItem';
import Divider from '@mui/material/Divider';
import Check from '@mui/icons-material/Check';
import PersonOutline from '@mui/icons-material/PersonOutlined';
import { useColorScheme } from '@mui/material/styles';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { answer, api } from '../api/client';
import { useMe } from '../api/hooks/useMe';
import { asProblem } from '../api/problem';
import { useNotices } from '../components/Notices';

const SCHEMES = [
  { mode: 'light', name: 'Light' },
  { mode: 'dark', name: 'Dark' },
  { mode: 'system', name: 'As the system' },
] as const;

/** Who is signed in, the colour scheme, and the way out. */
export function PersonMenu() {
  const { me } = useMe();
  const { mode, setMode } = useColorScheme();
  const { tell } = useNotices();
  const [anchor, setAnchor] = useState<HTMLElement | null>(null);
  if (!me) return null;

  const signOut = async () => {
    try {
      await answer(api.POST('/api/auth/sign-out'));
      // A whole new page: nothing of this person's data stays in memory.
      window.location.assign('/sign-in');
    } catch (error) {
      tell(asProblem(error).message);
    }
  };

  return (
    <>
      <Button
        color="inherit"
        aria-haspopup="menu"
        aria-expanded={anchor !== null}
        aria-label={`${me.name}: account and appearance`}
        onClick={(event) => setAnchor(event.currentTarget)}
        startIcon={<PersonOutline />}
        sx={{
          ml: 'auto',
          fontWeight: 500,
          minWidth: 0,
          '& .MuiButton-startIcon': { mr: { xs: 0, sm: 0.75 } },
        }}
      >
        <Box component="span" sx={{ display: { xs: 'none', sm: 'inline' } }}>
          {me.name}
        </Box>
      </Button>
      <Menu anchorEl={anchor} open={anchor !== null} onClose={() => setAnchor(null)}>
        <Box sx={{ px: 1.5, py: 0.75 }} role="presentation">
          <Typography sx={{ fontWeight: 600 }}>{me.name}</Typography>
          <Typography variant="body2" color="textSecondary">
            {me.email} · {me.roles.join(', ')}
          </Typography>
        </Box>
        <Divider component="li" />
        {SCHEMES.map((scheme) => (
          <MenuItem
            key={scheme.mode}
            role="menuitemradio"
            aria-checked={mode === scheme.mode}
            selected={mode === scheme.mode}
            onClick={() => setMode(scheme.mode)}
          >
            {scheme.name}
            {mode === scheme.mode && <Check fontSize="small" aria-hidden="true" sx={{ ml: 'auto', pl: 1 }} />}
          </MenuItem>
        ))}
        <Divider component="li" />
        <MenuItem onClick={() => void signOut()}>Sign out</MenuItem>
      </Menu>
    </>
  );
}
