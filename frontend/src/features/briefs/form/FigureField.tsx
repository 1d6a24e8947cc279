import InputAdornment from '@mui/material/InputAdornment';
import TextField from '@mui/material/TextField';
import { Controller, useFormContext } from 'react-hook-form';
import type { BriefField, BriefForm } from './briefForm';
import { FIELD_NAMES } from './fieldNames';
import { FieldRemarks, useRemarks } from './remarks';

interface FigureFieldProps {
  field: BriefField;
  unit?: string;
  label?: string;
  /** What a screen reader says where the visible label needs its neighbour: “Pinion to”. */
  spoken?: string;
  placeholder?: string;
  /** Remarks stand under the pair instead of under the field. */
  bare?: boolean;
}

/** A figure with its unit; keeps exactly what was typed and says under it what is wrong or worth knowing. */
export function FigureField({ field, unit, label, spoken, placeholder, bare = false }: FigureFieldProps) {
  const { control } = useFormContext<BriefForm>();
  const remarks = useRemarks(field);
  const remarksId = `remarks-${field}`;
  const crossed = remarks.some(({ kind }) => kind === 'crossed');
  return (
    <Controller
      control={control}
      name={field}
      render={({ field: input, fieldState }) => (
        <div>
          <TextField
            id={`brief-${field}`}
            label={label ?? FIELD_NAMES[field].label}
            fullWidth
            value={input.value}
            onChange={input.onChange}
            onBlur={input.onBlur}
            inputRef={input.ref}
            error={crossed || fieldState.invalid}
            placeholder={placeholder}
            slotProps={{
              htmlInput: {
                inputMode: 'decimal',
                autoComplete: 'off',
                'aria-label': spoken,
                'aria-describedby': remarks.length > 0 ? remarksId : undefined,
              },
              input: unit
                ? {
                    endAdornment: (
                      <InputAdornment position="end" disableTypography>
                        {unit}
                      </InputAdornment>
                    ),
                  }
                : undefined,
            }}
            sx={{ '& .MuiInputAdornment-root': { color: 'text.secondary', fontSize: '0.8125rem' } }}
          />
          {!bare && <FieldRemarks id={remarksId} remarks={remarks} />}
        </div>
      )}
    />
  );
}

interface RangeFieldsProps {
  from: BriefField;
  to: BriefField;
  unit?: string;
  title: string;
  openEnd?: boolean;
}

/** Two figures that bound a range, read as one line, remarks under the pair. */
export function RangeFields({ from, to, unit, title, openEnd = false }: RangeFieldsProps) {
  const remarks = [...useRemarks(from), ...useRemarks(to)];
  return (
    <div role="group" aria-label={title}>
      <div style={{ display: 'grid', gridTemplateColumns: '1fr 1fr', columnGap: 8 }}>
        <FigureField field={from} label={`${title} from`} unit={unit} bare />
        <FigureField
          field={to}
          label="to"
          spoken={`${title} to`}
          unit={unit}
          bare
          placeholder={openEnd ? 'no limit' : undefined}
        />
      </div>
      <FieldRemarks id={`remarks-${from}`} remarks={remarks} />
    </div>
  );
}
