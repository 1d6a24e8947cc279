import Box from '@mui/material/Box';
import { NavLink } from 'react-router-dom';
import { useMe } from '../api/hooks/useMe';
import { useOverview } from '../api/hooks/useOverview';
import type { Permission } from '../api/types';
import { formatCount } from '../components/figures';
import { Brand } from './Brand';

interface Place {
  to: string;
  name: string;
  needs: Permission | null;
  count: 'briefs' | 'trains' | 'parts' | 'suppliers' | null;
}

const PLACES: Place[] = [
  { to: '/', name: 'Today', needs: null, count: null },
  { to: '/briefs', name: 'Briefs', needs: 'briefs.read', count: 'briefs' },
  { to: '/trains', name: 'Trains', needs: 'trains.read', count: 'trains' },
  { to: '/parts', name: 'Parts', needs: 'parts.read', count: 'parts' },
  { to: '/suppliers', name: 'Suppliers', needs: 'prices.read', count: 'suppliers' },
  { to: '/offers', name: 'Offers', needs: 'prices.read', count: null },
  { to: '/stock', name: 'Stock', needs: 'stock.read', count: null },
  { to: '/people', name: 'People', needs: 'people.manage', count: null },
];

/** The side navigation: the rooms this person may enter, with how much stands in each. */
export function SideNav({ onGo }: { onGo?: () => void }) {
  const { can } = useMe();
  const { overview } = useOverview();
  return (
    <Box component="nav" aria-label="Main" sx={{ display: 'flex', flexDirection: 'column', height: '100%' }}>
      <Box sx={{ px: 2, height: 52, display: 'flex', alignItems: 'center' }}>
        <Brand />
      </Box>
      <Box component="ul" sx={{ listStyle: 'none', m: 0, p: 0, mt: 0.5 }}>
        {PLACES.filter(({ needs }) => needs === null || can(needs)).map((place) => (
          <li key={place.to}>
            <Box
              component={NavLink}
              to={place.to}
              end={place.to === '/'}
              onClick={onGo}
              sx={{
                display: 'flex',
                justifyContent: 'space-between',
                px: 2,
                py: 0.875,
                borderLeft: '3px solid transparent',
                color: 'text.primary',
                textDecoration: 'none',
                '&:hover': { bgcolor: 'wash.hover' },
                '&.active': {
                  fontWeight: 600,
                  color: 'primary.main',
                  bgcolor: 'wash.hover',
                  borderLeftColor: 'secondary.main',
                },
                '&:focus-visible': { outlineOffset: '-2px' },
              }}
            >
              <span>{place.name}</span>
              {place.count !== null && overview && (
                <Box component="span" sx={{ color: 'text.secondary', fontWeight: 400 }}>
                  {formatCount(overview.counts[place.count])}
                </Box>
              )}
            </Box>
          </li>
        ))}
      </Box>
    </Box>
  );
}
