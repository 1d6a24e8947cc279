import { fireEvent, screen } from '@testing-library/react';
import { expect, it, vi } from 'vitest';
import { renderAt } from '../../../testing/renderAt';
import { pretendServer, refusal } from '../../../testing/server';
import { DownloadBom } from './DownloadBom';

const PATH = '/api/trains/T-0007/bom.xlsx';

function show() {
  const onProblem = vi.fn();
  renderAt('/', '/', <DownloadBom code="T-0007" variant="outlined" onProblem={onProblem} />);
  return onProblem;
}

const link = () => screen.getByRole('link', { name: 'Download BOM (.xlsx)' });

it('is a plain link, and tells a refusal on the page', async () => {
  pretendServer({ [`GET ${PATH}`]: refusal(503, 'busy', 'The workbook took too long. Try again.') });
  const onProblem = show();
  expect(link()).toHaveAttribute('href', PATH);
  fireEvent.click(link());
  await vi.waitFor(() =>
    expect(onProblem).toHaveBeenLastCalledWith('The workbook took too long. Try again.'),
  );
  expect(onProblem).toHaveBeenNthCalledWith(1, null);
});

it('leaves a click that asks for another tab to the browser', () => {
  const { sent } = pretendServer({});
  show();
  // Were the click taken, it would be prevented and something sent.
  expect(fireEvent.click(link(), { ctrlKey: true })).toBe(true);
  expect(sent).toEqual([]);
});
