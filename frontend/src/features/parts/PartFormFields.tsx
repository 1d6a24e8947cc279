import Box from '@mui/material/Box';
import type { Control } from 'react-hook-form';
import { ChoiceField } from '../../components/ChoiceField';
import { NumberField } from '../../components/NumberField';
import { Sheet } from '../../components/Sheet';
import { TextInput } from '../../components/TextInput';
import type { PartForm } from './partForm';
import { ATTRIBUTES, KIND_NAMES, PART_KINDS, type AttributeField } from './partKinds';
import type { PartKind } from '../../api/types';

interface PartFormFieldsProps {
  control: Control<PartForm>;
  kind: PartKind;
  /** A new part chooses its number, kind and first standing; a stored one keeps them. */
  isNew: boolean;
}

/** All fields of one part: what it is, then the attributes of its kind, then supply and note. */
export function PartFormFields({ control, kind, isNew }: PartFormFieldsProps) {
  return (
    <>
      <Sheet title="What it is">
        <Box sx={gridSx}>
          {isNew && (
            <>
              <ChoiceField
                control={control}
                name="kind"
                label="Kind"
                choices={PART_KINDS.map((value) => ({ value, name: KIND_NAMES[value] }))}
              />
              <TextInput
                control={control}
                name="number"
                label="Number"
                hint="Blank: the next running one"
                most={40}
              />
              <ChoiceField
                control={control}
                name="standing"
                label="Standing"
                choices={[
                  { value: 'draft', name: 'draft' },
                  { value: 'cleared', name: 'cleared for use' },
                ]}
              />
            </>
          )}
          <Box sx={{ gridColumn: '1 / -1' }}>
            <TextInput control={control} name="description" label="Description" required most={200} />
          </Box>
        </Box>
      </Sheet>
      {ATTRIBUTES[kind].length > 0 && (
        <Sheet title={`${KIND_NAMES[kind]}: measures`}>
          <Box sx={gridSx}>
            {ATTRIBUTES[kind].map((field) => (
              <Attribute key={`${kind}-${field.name}`} control={control} field={field} />
            ))}
          </Box>
        </Sheet>
      )}
      <Sheet title="Material and supply">
        <Box sx={gridSx}>
          <TextInput control={control} name="material" label="Material" most={100} />
          <NumberField control={control} name="mass" label="Mass of one" unit="kg" min={0} above />
          <ChoiceField
            control={control}
            name="supply"
            label="Made or bought"
            choices={[
              { value: 'bought', name: 'bought' },
              { value: 'made', name: 'made by us' },
            ]}
          />
          <TextInput control={control} name="supplier" label="Supplier" most={200} />
          <Box sx={{ gridColumn: '1 / -1' }}>
            <TextInput control={control} name="note" label="Note" rows={3} most={10_000} />
          </Box>
        </Box>
      </Sheet>
    </>
  );
}

function Attribute({ control, field }: { control: Control<PartForm>; field: AttributeField }) {
  const name = `attr.${field.name}` as const;
  if (field.type === 'choice') {
    return (
      <ChoiceField
        control={control}
        name={name}
        label={field.label}
        choices={field.choices ?? []}
        hint={field.hint}
        required={field.required}
      />
    );
  }
  if (field.type === 'text') {
    return (
      <TextInput
        control={control}
        name={name}
        label={field.label}
        hint={field.hint}
        required={field.required}
        most={100}
      />
    );
  }
  return (
    <NumberField
      control={control}
      name={name}
      label={field.label}
      unit={field.unit}
      hint={field.hint}
      required={field.required}
      whole={field.whole}
    />
  );
}

const gridSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr 1fr', sm: 'repeat(auto-fill, minmax(168px, 1fr))' },
  columnGap: 1.5,
  rowGap: 1.5,
  alignItems: 'start',
} as const;
