import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { newBrief, requirement } from '../../../testing/briefs';
import { renderAt } from '../../../testing/renderAt';
import { pretendServer, refusal } from '../../../testing/server';
import { BriefFormView } from './BriefFormView';

const show = (brief = newBrief()) => {
  const onSaved = vi.fn();
  renderAt('/briefs/7', '/briefs/:id', <BriefFormView brief={brief} onSaved={onSaved} onLeave={vi.fn()} />);
  return onSaved;
};

const textbox = (label: string) => screen.getByLabelText(label, { selector: 'input, textarea' });

/** At once, not key by key: the form redraws on every key, and these tests are not about that. */
const type = (label: string, text: string) => fireEvent.change(textbox(label), { target: { value: text } });

const save = () => fireEvent.click(screen.getByText('Save brief'));

describe('the brief form', () => {
  it('sends what was typed with the version it began from', async () => {
    const saved = newBrief({ version: 4 });
    const { sent } = pretendServer({ 'PATCH /api/briefs/7': { body: saved } });
    const onSaved = show();
    type('Ratio', '36,25');
    save();
    await vi.waitFor(() => expect(onSaved).toHaveBeenCalledWith(saved));
    expect(sent[0]?.body).toMatchObject({
      version: 3,
      requirement: { ratio: { target: '36.25', tolerancePercent: '1' } },
    });
  });

  it('keeps what was typed when the server refuses, and says it at the field', async () => {
    const message = 'Ratio must be at most 1,000,000.';
    pretendServer({
      'PATCH /api/briefs/7': refusal(400, 'bad-input', 'One field cannot be taken.', {
        errors: [{ field: 'requirement.ratio.target', value: '99', message }],
      }),
    });
    const onSaved = show();
    type('Ratio', '99');
    type('Note', 'for the raft');
    save();
    expect(await screen.findByText('One field cannot be taken.')).toBeVisible();
    expect(screen.getAllByText(message).length).toBeGreaterThan(0);
    expect(textbox('Ratio')).toHaveValue('99');
    expect(textbox('Ratio')).toHaveAttribute('aria-invalid', 'true');
    expect(textbox('Note')).toHaveValue('for the raft');
    expect(onSaved).not.toHaveBeenCalled();
  });

  it('sends nothing while a figure cannot be read, and leads to it', () => {
    const { sent } = pretendServer({});
    show();
    type('Ratio', '1,400');
    save();
    expect(sent).toEqual([]);
    expect(textbox('Ratio')).toHaveFocus();
    expect(screen.getAllByText(/can be read as 1400 or as 1\.4/).length).toBeGreaterThan(0);
  });

  it('shows a crossed limit while typing, before anything is saved', async () => {
    show();
    type('Pinion from', '50');
    const check = screen.getByRole('complementary', { name: 'Check of the brief' });
    expect(await within(check).findByText('Cannot be met')).toBeVisible();
  });

  describe('when somebody else saved meanwhile', () => {
    const theirs = newBrief({
      version: 9,
      note: 'their note',
      requirement: { ...requirement, ratio: { target: '40', tolerancePercent: '1' } },
    });
    const changed = refusal(409, 'changed-meanwhile', 'Changed meanwhile.', { current: theirs });

    it('shows what changed beside what was typed, and loses neither', async () => {
      pretendServer({ 'PATCH /api/briefs/7': changed });
      show();
      type('Ratio', '36');
      save();
      const panel = await screen.findByRole('alert');
      const row = within(panel).getByRole('row', { name: /^Ratio/ });
      expect(row).toHaveTextContent('37.5');
      expect(row).toHaveTextContent('40');
      expect(row).toHaveTextContent('36 (both changed)');
      expect(textbox('Ratio')).toHaveValue('36');
    });

    it('saves mine over theirs with their version', async () => {
      let calls = 0;
      const { sent } = pretendServer({
        'PATCH /api/briefs/7': () => (++calls === 1 ? changed : { body: newBrief({ version: 10 }) }),
      });
      const onSaved = show();
      type('Ratio', '36');
      save();
      fireEvent.click(await screen.findByText('Save mine over theirs'));
      await vi.waitFor(() => expect(onSaved).toHaveBeenCalled());
      expect(sent[1]?.body).toMatchObject({ version: 9, requirement: { ratio: { target: '36' } } });
    });

    it('takes their changes and keeps my others', async () => {
      pretendServer({ 'PATCH /api/briefs/7': changed });
      show();
      type('Ratio', '36');
      type('Title', 'Winch, port side');
      save();
      fireEvent.click(await screen.findByText(/Take their changes/));
      expect(textbox('Ratio')).toHaveValue('40');
      expect(textbox('Note')).toHaveValue('their note');
      expect(textbox('Title')).toHaveValue('Winch, port side');
    });
  });
});
