import SearchIcon from '@mui/icons-material/Search';
import Autocomplete from '@mui/material/Autocomplete';
import Box from '@mui/material/Box';
import InputAdornment from '@mui/material/InputAdornment';
import TextField from '@mui/material/TextField';
import { useEffect, useRef, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { useFinder } from '../api/hooks/useFinder';
import { useMe } from '../api/hooks/useMe';
import type { FinderResult } from '../api/types';

interface Hit {
  group: string;
  key: string;
  label: string;
  detail: string;
  to: string;
}

function hitsOf(found: FinderResult | undefined): Hit[] {
  if (!found) return [];
  return [
    ...found.parts.map((p) => ({
      group: 'Parts',
      key: `p-${p.number}`,
      label: p.number,
      detail: p.description,
      to: `/parts/${encodeURIComponent(p.number)}`,
    })),
    ...found.briefs.map((b) => ({
      group: 'Briefs',
      key: `b-${b.id}`,
      label: b.code,
      detail: b.title,
      to: `/briefs/${encodeURIComponent(b.id)}`,
    })),
    ...found.trains.map((t) => ({
      group: 'Trains',
      key: `t-${t.code}`,
      label: t.code,
      detail: t.title,
      to: `/trains/${encodeURIComponent(t.code)}`,
    })),
    ...found.suppliers.map((s) => ({
      group: 'Suppliers',
      key: `s-${s.code}`,
      label: s.code,
      detail: s.name,
      to: `/suppliers/${encodeURIComponent(s.code)}`,
    })),
  ];
}

const typing = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  (target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName));

/** Search over parts, briefs, trains and (for those who see prices) suppliers; `/` puts the cursor here from anywhere outside a field. */
export function HeaderSearch() {
  const navigate = useNavigate();
  const input = useRef<HTMLInputElement>(null);
  const [text, setText] = useState('');
  const { found, isLoading, problem } = useFinder(text);
  const { can } = useMe();
  const prices = can('prices.read');

  useEffect(() => {
    const toSearch = (event: KeyboardEvent) => {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || typing(event.target)) return;
      event.preventDefault();
      input.current?.focus();
      input.current?.select();
    };
    document.addEventListener('keydown', toSearch);
    return () => document.removeEventListener('keydown', toSearch);
  }, []);

  const nothing = problem ? problem.message : `Nothing carries “${text.trim()}”.`;
  return (
    <Autocomplete<Hit, false, false, false>
      options={hitsOf(found)}
      groupBy={(hit) => hit.group}
      getOptionLabel={(hit) => hit.label}
      getOptionKey={(hit) => hit.key}
      filterOptions={(hits) => hits}
      value={null}
      inputValue={text}
      onInputChange={(_, value, reason) => {
        if (reason !== 'reset' && reason !== 'selectOption') setText(value);
      }}
      onChange={(_, hit) => {
        if (!hit) return;
        setText('');
        input.current?.blur();
        void navigate(hit.to);
      }}
      blurOnSelect
      clearOnBlur={false}
      autoHighlight
      loading={isLoading}
      loadingText="Searching…"
      noOptionsText={text.trim() === '' ? 'Number, code, title, name or description' : nothing}
      forcePopupIcon={false}
      sx={{ flex: '0 1 420px', minWidth: 0 }}
      renderOption={({ key, ...props }, hit) => (
        <Box component="li" key={key} {...props} sx={{ display: 'flex', gap: 1, alignItems: 'baseline' }}>
          <span className="part-number">{hit.label}</span>
          <Box
            component="span"
            sx={{ color: 'text.secondary', overflow: 'hidden', textOverflow: 'ellipsis' }}
          >
            {hit.detail}
          </Box>
        </Box>
      )}
      renderInput={(params) => (
        <TextField
          {...params}
          inputRef={input}
          placeholder={prices ? 'Search parts, briefs, trains, suppliers' : 'Search parts, briefs, trains'}
          slotProps={{
            ...params.slotProps,
            htmlInput: {
              ...params.slotProps.htmlInput,
              'aria-label': prices
                ? 'Search parts, briefs, trains and suppliers'
                : 'Search parts, briefs and trains',
            },
            input: {
              ...params.slotProps.input,
              startAdornment: (
                <InputAdornment position="start" sx={{ mr: 0 }}>
                  <SearchIcon fontSize="small" />
                </InputAdornment>
              ),
              endAdornment: (
                <Box component="kbd" sx={keyHint} aria-hidden="true">
                  /
                </Box>
              ),
            },
          }}
        />
      )}
    />
  );
}

const keyHint = {
  display: { xs: 'none', md: 'inline-block' },
  fontFamily: 'inherit',
  fontSize: 12,
  lineHeight: '18px',
  px: 0.75,
  color: 'text.secondary',
  border: '1px solid',
  borderColor: 'line.strong',
  borderRadius: '3px',
} as const;
