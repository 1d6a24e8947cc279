import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import type { Supplier } from '../../api/types';
import { CopyTable } from '../../components/CopyTable';
import { EmptyState } from '../../components/EmptyState';
import { NOTHING } from '../../components/figures';
import { Sheet } from '../../components/Sheet';

/** Whom to ask: a click writes or calls. */
export function SupplierContacts({ contacts }: { contacts: Supplier['contacts'] }) {
  return (
    <Sheet title="Contacts for enquiries" flush>
      {contacts.length === 0 ? (
        <EmptyState title="Nobody to ask yet">Edit the supplier and add who answers enquiries.</EmptyState>
      ) : (
        <TableContainer>
          <CopyTable label="Contacts for enquiries">
            <TableHead>
              <TableRow>
                <TableCell>Name</TableCell>
                <TableCell sx={WIDE_ONLY}>Role there</TableCell>
                <TableCell>E-mail</TableCell>
                <TableCell sx={WIDE_ONLY}>Telephone</TableCell>
              </TableRow>
            </TableHead>
            <TableBody>
              {contacts.map(({ name, role, email, phone }, index) => (
                <TableRow key={index} sx={{ '&:last-of-type > *': { borderBottom: 0 } }}>
                  <TableCell>
                    {name}
                    {role !== '' && <Box sx={NARROW_ONLY}>{role}</Box>}
                  </TableCell>
                  <TableCell sx={WIDE_ONLY}>{role || NOTHING}</TableCell>
                  <TableCell>
                    {email === '' ? NOTHING : <Link href={`mailto:${email}`}>{email}</Link>}
                    {phone !== '' && (
                      <Box sx={NARROW_ONLY}>
                        <Link href={dialLink(phone)}>{phone}</Link>
                      </Box>
                    )}
                  </TableCell>
                  <TableCell sx={{ ...WIDE_ONLY, whiteSpace: 'nowrap' }}>
                    {phone === '' ? NOTHING : <Link href={dialLink(phone)}>{phone}</Link>}
                  </TableCell>
                </TableRow>
              ))}
            </TableBody>
          </CopyTable>
        </TableContainer>
      )}
    </Sheet>
  );
}

const WIDE_ONLY = { display: { xs: 'none', sm: 'table-cell' } } as const;
const NARROW_ONLY = { display: { sm: 'none' }, color: 'text.secondary', fontSize: '0.75rem' } as const;

/** A telephone dials digits and a leading plus; what else people write to read it better is left out (RFC 3966). */
const dialLink = (phone: string): string => `tel:${phone.replace(/\(0\)/g, '').replace(/[^\d+]/g, '')}`;
