import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useForm } from 'react-hook-form';
import { describe, expect, it, vi } from 'vitest';
import { NumberField, numberProblem } from './NumberField';

describe('numberProblem', () => {
  it('takes a decimal comma and a decimal point', () => {
    expect(numberProblem('1,25', {})).toBeNull();
    expect(numberProblem('1.25', { min: 1, max: 2 })).toBeNull();
  });

  it('says the limit with its unit', () => {
    expect(numberProblem('0', { min: 0, above: true }, 'mm')).toBe('Must be above 0 mm.');
    expect(numberProblem('51', { max: 50 }, 'mm')).toBe('Must be at most 50 mm.');
    expect(numberProblem('12.5', { whole: true })).toMatch(/whole number/);
  });

  it('refuses words, a blank that is required, and a comma that may part thousands', () => {
    expect(numberProblem('twelve', {})).toMatch(/not a number/);
    expect(numberProblem('', { required: true })).not.toBeNull();
    expect(numberProblem('', {})).toBeNull();
    expect(numberProblem('1,400', {})).toMatch(/1400/);
  });
});

describe('NumberField', () => {
  function Form({ onSend }: { onSend: (width: string) => void }) {
    const { control, handleSubmit } = useForm({ defaultValues: { width: '' } });
    return (
      <form onSubmit={(event) => void handleSubmit(({ width }) => onSend(width))(event)}>
        <NumberField control={control} name="width" label="Face width" unit="mm" min={0} above />
        <button type="submit">Send</button>
      </form>
    );
  }

  it('keeps what was typed, says the fault at the field, and sends only what is in order', async () => {
    const onSend = vi.fn();
    const user = userEvent.setup();
    render(<Form onSend={onSend} />);
    const field = screen.getByLabelText('Face width');
    await user.type(field, '-2,50');
    await user.click(screen.getByRole('button', { name: 'Send' }));
    expect(field).toHaveValue('-2,50');
    expect(field).toBeInvalid();
    expect(screen.getByText('Must be above 0 mm.')).toBeVisible();
    expect(onSend).not.toHaveBeenCalled();
    await user.clear(field);
    await user.type(field, '2,50');
    await user.click(screen.getByRole('button', { name: 'Send' }));
    expect(onSend).toHaveBeenCalledWith('2,50');
  });
});
