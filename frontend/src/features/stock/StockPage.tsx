import Button from '@mui/material/Button';
import Tab from '@mui/material/Tab';
import Tabs from '@mui/material/Tabs';
import { useState } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { NoPermission } from '../../components/NoPermission';
import { PageHeader } from '../../components/PageHeader';
import { MovementDialog } from '../../components/stock/MovementDialog';
import { MovementsTab } from './MovementsTab';
import { ShelfTab } from './ShelfTab';

/** What lies on the shelves, and the movements that made it so; tab, filters, order and page live in the address. */
export default function StockPage() {
  const [params] = useSearchParams();
  const { can } = useMe();
  const [booking, setBooking] = useState(false);
  const tab = params.get('tab') === 'movements' ? 'movements' : 'shelf';
  if (!can('stock.read')) {
    return (
      <>
        <PageHeader title="Stock" />
        <NoPermission />
      </>
    );
  }
  return (
    <>
      <PageHeader
        title="Stock"
        actions={
          can('stock.book') && (
            <>
              <Button variant="outlined" component={Link} to="/stock/count">
                Count
              </Button>
              <Button variant="contained" onClick={() => setBooking(true)}>
                Book a movement
              </Button>
            </>
          )
        }
      />
      <Tabs value={tab} aria-label="Stock" sx={{ mb: 1.5 }}>
        <Tab value="shelf" label="On the shelf" component={Link} to="/stock" replace />
        <Tab value="movements" label="Movements" component={Link} to="/stock?tab=movements" replace />
      </Tabs>
      {tab === 'shelf' ? <ShelfTab onBook={() => setBooking(true)} /> : <MovementsTab />}
      {booking && <MovementDialog number={null} kind="received" onClose={() => setBooking(false)} />}
    </>
  );
}
