import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import type { Welcome } from '../../api/types';

interface DemoAccountsProps {
  accounts: Welcome['accounts'];
  disabled: boolean;
  onChoose: (email: string) => void;
}

const DOES: Record<string, string> = {
  designer: 'Designer: briefs, searches and trains',
  librarian: 'Librarian: keeps the parts',
  purchaser: 'Purchaser: bills of materials',
  viewer: 'Viewer: looks up and prints',
  admin: 'Administrator: people and roles',
};

/** Demo mode only: one click signs in as one of the invented people. */
export function DemoAccounts({ accounts, disabled, onChoose }: DemoAccountsProps) {
  return (
    <Box
      component="section"
      aria-labelledby="demo"
      sx={{ mt: 4, pt: 2, borderTop: 1, borderColor: 'line.rule' }}
    >
      <Typography variant="h2" id="demo">
        Try it with a demo account
      </Typography>
      <Typography variant="body2" color="textSecondary" sx={{ mb: 1 }}>
        Bracken Bay is an invented workshop; change what you like.
      </Typography>
      <Box component="ul" sx={{ listStyle: 'none', m: 0, p: 0 }}>
        {accounts.map(({ email, name, role }) => (
          <Box component="li" key={email} sx={{ borderBottom: '1px solid', borderColor: 'line.rule' }}>
            <Button
              fullWidth
              color="inherit"
              disabled={disabled}
              onClick={() => onChoose(email)}
              sx={{
                justifyContent: 'flex-start',
                gap: 1.5,
                px: 1,
                minHeight: 36,
                fontWeight: 400,
                textAlign: 'left',
              }}
            >
              <Box component="span" sx={{ fontWeight: 600, minWidth: 84 }}>
                {name}
              </Box>
              <Box component="span" sx={{ color: 'text.secondary', whiteSpace: 'normal' }}>
                {DOES[role] ?? email}
              </Box>
            </Button>
          </Box>
        ))}
      </Box>
    </Box>
  );
}
