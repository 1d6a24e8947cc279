import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Supplier, SupplierInput, SupplierPatch } from '../types';
import { readAgain } from './readAgain';

/** One supplier; none where the code is null. An edit form keeps its own copy: this does not ask again on focus. */
export function useSupplier(code: string | null) {
  const { data, error, isLoading, mutate } = useSWR<Supplier, unknown>(
    code === null ? null : ['/api/suppliers/one', code],
    ([, wanted]: [string, string]) =>
      answer(api.GET('/api/suppliers/{code}', { params: { path: { code: wanted } } })),
    { revalidateOnFocus: false },
  );
  return { supplier: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}

/** @throws Problem when refused */
export async function addSupplier(body: SupplierInput): Promise<Supplier> {
  const supplier = await answer(api.POST('/api/suppliers', { body }));
  readAgain('/api/suppliers', '/api/overview');
  return supplier;
}

/** Changes a supplier, if it still has the version that was seen. @throws Problem when refused */
export async function saveSupplier(code: string, body: SupplierPatch): Promise<Supplier> {
  const supplier = await answer(api.PATCH('/api/suppliers/{code}', { params: { path: { code } }, body }));
  readAgain('/api/suppliers', '/api/offers', '/api/parts/offers', '/api/overview');
  return supplier;
}
