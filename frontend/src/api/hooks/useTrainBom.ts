import useSWR from 'swr';
import { answer, api } from '../client';
import type { Bom } from '../types';

/** The bill of materials of one train. */
export function useTrainBom(code: string) {
  return useSWR<Bom, unknown>(['/api/trains/{code}/bom', code], () =>
    answer(api.GET('/api/trains/{code}/bom', { params: { path: { code } } })),
  );
}

/** Where the workbook is fetched from; a plain link, so the browser names and saves the file. */
export const bomWorkbookUrl = (code: string): string => `/api/trains/${encodeURIComponent(code)}/bom.xlsx`;
