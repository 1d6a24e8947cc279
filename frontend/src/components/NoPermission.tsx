import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';

/** Shown instead of a page or action that this person's roles do not include. */
export function NoPermission({ message }: { message?: string }) {
  return (
    <Box role="alert" sx={{ py: 3, px: 2, maxWidth: 560 }}>
      <Typography variant="h2" gutterBottom>
        Your role does not include this
      </Typography>
      <Typography color="textSecondary">
        {message ?? 'An administrator can give you a role that does.'}
      </Typography>
    </Box>
  );
}

/** The same for pages of suppliers, offers and prices. */
export function NoPrices() {
  return <NoPermission message="Suppliers and prices are for designers, librarians and purchasers." />;
}
