import useSWR from 'swr';
import { answer, api } from '../client';
import { problemFrom } from '../problem';
import type { Bom } from '../types';

/** The bill of materials of one train. */
export function useTrainBom(code: string) {
  return useSWR<Bom, unknown>(['/api/trains/{code}/bom', code], () =>
    answer(api.GET('/api/trains/{code}/bom', { params: { path: { code } } })),
  );
}

/** The bill of materials as it stands on the server now. @throws Problem */
export function readBom(code: string): Promise<Bom> {
  return answer(api.GET('/api/trains/{code}/bom', { params: { path: { code } } }));
}

/** Where the workbook is fetched from. */
export const bomWorkbookUrl = (code: string): string => `/api/trains/${encodeURIComponent(code)}/bom.xlsx`;

/**
 * The workbook and the name that the server gives it.
 * @throws Problem when the server refused; anything else thrown means that no answer came
 */
export async function fetchWorkbook(code: string): Promise<{ file: Blob; name: string }> {
  const response = await fetch(new Request(new URL(bomWorkbookUrl(code), location.origin)));
  if (!response.ok) throw await problemFrom(response);
  const named = /filename="([^"]+)"/.exec(response.headers.get('content-disposition') ?? '')?.[1];
  return { file: await response.blob(), name: named ?? `${code}-bom.xlsx` };
}
