import { useRef } from 'react';
import type { UseFormSetError } from 'react-hook-form';
import { bookMovement, keepStockItem } from '../../api/hooks/useStockItem';
import { asProblem } from '../../api/problem';
import type { Movement, StockItem } from '../../api/types';
import { applyProblem } from '../applyProblem';
import { MOVEMENT_FIELDS, type MovementForm, movementOf } from './movementForm';
import { newRequestKey } from './requestKey';

type Booked = { movement: Movement; refusal: null } | { movement: null; refusal: string | null };

/**
 * Sends a movement. Sent again unchanged, after an answer that never came, it carries the same key: it books once.
 * A refusal that shows the shelf as it stands puts that in front of the form.
 */
export function useBooking() {
  const sent = useRef({ text: '', key: '' });
  return async (
    form: MovementForm,
    item: StockItem | undefined,
    setError: UseFormSetError<MovementForm>,
  ): Promise<Booked> => {
    const text = JSON.stringify(form);
    if (sent.current.text !== text) sent.current = { text, key: newRequestKey() };
    try {
      return { movement: await bookMovement(movementOf(form, item, sent.current.key)), refusal: null };
    } catch (error) {
      const problem = asProblem(error);
      if (!problem.noAnswer) sent.current = { text: '', key: '' };
      if (isStockItem(problem.current)) await keepStockItem(problem.current);
      if (problem.statusCode === 404) setError('number', { message: problem.message });
      const fieldOf = (path: string) => MOVEMENT_FIELDS.find((field) => field === path) ?? null;
      return { movement: null, refusal: applyProblem(problem, setError, fieldOf) };
    }
  };
}

function isStockItem(thing: unknown): thing is StockItem {
  return typeof thing === 'object' && thing !== null && 'places' in thing && 'number' in thing;
}
