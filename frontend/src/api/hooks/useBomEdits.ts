import useSWR, { type SWRResponse } from 'swr';
import { answer, api } from '../client';
import type {
  BomPasteBooked,
  BomPastePreview,
  ExtraLineInput,
  Substitutes,
  SwapInput,
  SwapResult,
  Train,
} from '../types';
import { keepTrain } from './useTrain';

/** Parts that could take the place of a line's, the soonest there first. */
export function useLineSubstitutes(
  code: string,
  key: string,
  quantity: number,
): SWRResponse<Substitutes, unknown> {
  return useSWR<Substitutes, unknown>(['/api/trains/{code}/substitutes', code, key, quantity], () =>
    answer(
      api.GET('/api/trains/{code}/substitutes', { params: { path: { code }, query: { key, quantity } } }),
    ),
  );
}

/** What a swap would change; nothing is booked. @throws Problem 409 when the train changed meanwhile */
export function trySwap(code: string, swap: Omit<SwapInput, 'dryRun'>): Promise<SwapResult> {
  const body = { ...swap, dryRun: true };
  return answer(api.POST('/api/trains/{code}/swaps', { params: { path: { code } }, body }));
}

/** Takes another part for a line (null: the kit's own). @throws Problem 409 when the train changed meanwhile */
export async function bookSwap(code: string, swap: Omit<SwapInput, 'dryRun'>): Promise<Train> {
  const body = { ...swap, dryRun: false };
  const { train } = await answer(api.POST('/api/trains/{code}/swaps', { params: { path: { code } }, body }));
  // A booked swap always carries the train.
  return keepTrain(train as Train);
}

/** Puts these in place of all added lines. @throws Problem 400 naming the fields, 409 with the train as it stands */
export async function saveExtraLines(code: string, version: number, lines: ExtraLineInput[]): Promise<Train> {
  return keepTrain(
    await answer(
      api.PUT('/api/trains/{code}/extra-lines', { params: { path: { code } }, body: { version, lines } }),
    ),
  );
}

/** What pasted rows would do to a bill of materials. @throws Problem 400 when the text is no table */
export function previewBomPaste(code: string, text: string): Promise<BomPastePreview> {
  return answer(api.POST('/api/trains/{code}/bom-paste', { params: { path: { code } }, body: { text } }));
}

/** Books pasted rows as previewed. @throws Problem 409 `preview-outdated` with the new preview */
export async function bookBomPaste(
  code: string,
  text: string,
  { token, version }: Pick<BomPastePreview, 'token' | 'version'>,
  leaveOutWrong: boolean,
): Promise<BomPasteBooked> {
  const body = { text, token, version, leaveOutWrong };
  const booked = await answer(
    api.POST('/api/trains/{code}/bom-paste/book', { params: { path: { code } }, body }),
  );
  await keepTrain(booked.train);
  return booked;
}
