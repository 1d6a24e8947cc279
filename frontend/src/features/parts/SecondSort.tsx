import MenuItem from '@mui/material/MenuItem';
import TextField from '@mui/material/TextField';
import type { ListState } from '../../components/useListState';
import { PART_SORTS, SORT_NAMES, type PartFilter } from './partFilters';

/** The second sort key: the table's head holds only one. */
export function SecondSort({ state }: { state: ListState<PartFilter> }) {
  const [first, second] = state.sort;
  const value = second === undefined ? '' : `${second.down ? '-' : ''}${second.field}`;
  const choose = (key: string) => {
    const main = first ?? { field: 'number', down: false };
    const then = key === '' ? [] : [{ field: key.replace(/^-/, ''), down: key.startsWith('-') }];
    state.setSort([main, ...then]);
  };
  const others = PART_SORTS.filter((name) => name !== (first?.field ?? 'number'));
  return (
    <TextField
      select
      label={`Then sort by`}
      value={value}
      onChange={(event) => choose(event.target.value)}
      sx={{ width: 190 }}
      slotProps={{ select: { displayEmpty: true } }}
    >
      <MenuItem value="">nothing more</MenuItem>
      {others.flatMap((name) => [
        <MenuItem key={name} value={name}>{`${SORT_NAMES[name]}, upwards`}</MenuItem>,
        <MenuItem key={`-${name}`} value={`-${name}`}>{`${SORT_NAMES[name]}, downwards`}</MenuItem>,
      ])}
    </TextField>
  );
}
