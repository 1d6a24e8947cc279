import Delete from '@mui/icons-material/DeleteOutlined';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import IconButton from '@mui/material/IconButton';
import Typography from '@mui/material/Typography';
import { useFieldArray, useWatch, type Control } from 'react-hook-form';
import { Sheet } from '../../components/Sheet';
import { TextInput } from '../../components/TextInput';
import { BLANK_CONTACT, isBlankContact, type SupplierForm } from './supplierForm';

/** As the server allows. */
const MOST_CONTACTS = 20;

/** The people that enquiries go to, one row each. */
export function ContactsEditor({ control }: { control: Control<SupplierForm> }) {
  const { fields, append, remove } = useFieldArray({ control, name: 'contacts' });
  const typed = useWatch({ control, name: 'contacts' });
  return (
    <Sheet title="Contacts for enquiries">
      {fields.length === 0 && (
        <Typography color="textSecondary" sx={{ mb: 1 }}>
          Nobody yet. Enquiries need somebody to go to.
        </Typography>
      )}
      {fields.map((row, index) => (
        <Box key={row.id} role="group" aria-label={`Contact ${index + 1}`} sx={rowSx}>
          <TextInput
            control={control}
            name={`contacts.${index}.name`}
            label="Name"
            most={120}
            required={!isBlankContact(typed[index] ?? BLANK_CONTACT)}
          />
          <TextInput control={control} name={`contacts.${index}.role`} label="Role there" most={120} />
          <Box sx={{ gridColumn: { xs: '1 / -1', md: 'auto' } }}>
            <TextInput
              control={control}
              name={`contacts.${index}.email`}
              label="E-mail"
              type="email"
              most={254}
            />
          </Box>
          <TextInput control={control} name={`contacts.${index}.phone`} label="Telephone" most={60} />
          <IconButton
            aria-label={`Remove contact ${index + 1}`}
            onClick={() => remove(index)}
            sx={{ alignSelf: 'start', mt: 2.75, justifySelf: 'end' }}
          >
            <Delete fontSize="small" />
          </IconButton>
        </Box>
      ))}
      <Button
        variant="outlined"
        disabled={fields.length >= MOST_CONTACTS}
        onClick={() => append(BLANK_CONTACT)}
      >
        Add a contact
      </Button>
    </Sheet>
  );
}

const rowSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr 1fr', md: '1.2fr 1fr 1.4fr 1fr 34px' },
  columnGap: 1.5,
  rowGap: 1,
  mb: 1.5,
  pb: { xs: 1.5, md: 0 },
  borderBottomStyle: 'solid',
  borderBottomWidth: { xs: 1, md: 0 },
  borderColor: 'line.rule',
} as const;
