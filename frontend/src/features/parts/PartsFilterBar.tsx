import Tune from '@mui/icons-material/Tune';
import Button from '@mui/material/Button';
import type { ReactNode } from 'react';
import useMediaQuery from '@mui/material/useMediaQuery';
import { useTheme } from '@mui/material/styles';
import { useState } from 'react';
import { usePartFacets } from '../../api/hooks/usePartFacets';
import type { PartKind } from '../../api/types';
import { formatPlain } from '../../components/figures';
import { FilterBar } from '../../components/FilterBar';
import type { ListState } from '../../components/useListState';
import { ChoiceFilter, TypedFilter } from '../../components/FilterFields';
import { PART_FILTERS, type PartFilter } from './partFilters';
import { KIND_NAMES, PART_KINDS, STANDINGS } from './partKinds';
import { SecondSort } from './SecondSort';

interface PartsFilterBarProps {
  state: ListState<PartFilter>;
  result: ReactNode;
}

const MORE: readonly PartFilter[] = [
  'pressureAngleDeg',
  'helixAngleDeg',
  'hand',
  'boreMin',
  'boreMax',
  'faceWidthMin',
  'faceWidthMax',
];

/** The library's filters; the rarer ones fold away until one of them is set. */
export function PartsFilterBar({ state, result }: PartsFilterBarProps) {
  const { facets } = usePartFacets();
  const narrow = useMediaQuery(useTheme().breakpoints.down('sm'));
  // On a laptop one filter more would take the table a row.
  const roomy = useMediaQuery('(min-width: 1400px)');
  // A second sort key shows itself, too: an order that nobody can see looks like none.
  const rareSet =
    state.sort.length > 1 ||
    (!roomy && state.filters.shelf !== undefined) ||
    (narrow ? PART_FILTERS.filter((name) => name !== 'text') : MORE).some(
      (name) => state.filters[name] !== undefined,
    );
  const [open, setOpen] = useState(false);
  const bind = (name: PartFilter) => ({
    value: state.filters[name] ?? '',
    onSet: (value: string) => {
      if (value !== (state.filters[name] ?? '')) state.setFilters({ [name]: value });
    },
  });
  const count = (list: { value: string; count: number }[] | undefined, value: string) => {
    const found = list?.find((each) => each.value === value)?.count;
    return found === undefined ? {} : { count: found };
  };
  const kinds = PART_KINDS.map((kind: PartKind) => ({
    value: kind,
    name: KIND_NAMES[kind],
    ...count(facets?.kinds, kind),
  }));
  const standings = STANDINGS.map((each) => ({ value: each, name: each, ...count(facets?.standings, each) }));
  const modules = (facets?.modules ?? []).map(({ value, count: many }) => ({
    value: String(value),
    name: formatPlain(value),
    count: many,
  }));
  const materials = (facets?.materials ?? []).map(({ value, count: many }) => ({
    value,
    name: value,
    count: many,
  }));
  const shelf = (
    <ChoiceFilter
      label="Shelf"
      width={96}
      choices={[
        { value: 'there', name: 'there' },
        { value: 'low', name: 'low' },
      ]}
      {...bind('shelf')}
    />
  );
  const shown = open || rareSet;
  return (
    <FilterBar filterCount={state.filterCount} onClear={state.clearFilters} result={result}>
      <TypedFilter label="Number or words" width={130} {...bind('text')} />
      {(!narrow || shown) && (
        <>
          <ChoiceFilter label="Kind" width={128} choices={kinds} {...bind('kind')} />
          <ChoiceFilter label="Module, mm" width={92} choices={modules} {...bind('module')} />
          <TypedFilter figure label="Teeth, least" width={84} {...bind('teethMin')} />
          <TypedFilter figure label="most" width={72} {...bind('teethMax')} />
          <ChoiceFilter label="Material" width={128} choices={materials} {...bind('material')} />
          <ChoiceFilter label="Standing" width={108} choices={standings} {...bind('standing')} />
          {roomy && shelf}
        </>
      )}
      {shown && (
        <>
          <ChoiceFilter
            label="Helix"
            width={92}
            choices={[
              { value: '0', name: 'spur' },
              ...[15, 20, 30].map((angle) => ({ value: String(angle), name: `${angle}°` })),
            ]}
            {...bind('helixAngleDeg')}
          />
          <ChoiceFilter
            label="Hand"
            width={84}
            choices={['left', 'right'].map((hand) => ({ value: hand, name: hand }))}
            {...bind('hand')}
          />
          <ChoiceFilter
            label="Pressure angle"
            width={112}
            choices={['14.5', '20', '25'].map((angle) => ({ value: angle, name: `${angle}°` }))}
            {...bind('pressureAngleDeg')}
          />
          <TypedFilter figure label="Bore mm, least" width={104} {...bind('boreMin')} />
          <TypedFilter figure label="most" width={72} {...bind('boreMax')} />
          <TypedFilter figure label="Face mm, least" width={104} {...bind('faceWidthMin')} />
          <TypedFilter figure label="most" width={72} {...bind('faceWidthMax')} />
          {!roomy && shelf}
          <SecondSort state={state} />
        </>
      )}
      {!rareSet && (
        <Button startIcon={<Tune />} aria-expanded={shown} onClick={() => setOpen(!open)}>
          {open ? 'Fewer' : narrow ? 'Filters' : 'More'}
        </Button>
      )}
    </FilterBar>
  );
}
