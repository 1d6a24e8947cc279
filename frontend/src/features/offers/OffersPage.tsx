import Button from '@mui/material/Button';
import { Link, useSearchParams } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { NoPrices } from '../../components/NoPermission';
import { OffersTable } from '../../components/offers/OffersTable';
import { PageHeader } from '../../components/PageHeader';
import { PasteOffers } from './PasteOffers';
import { SupplierFilter } from './SupplierFilter';

/** Every supplier's price row for every part. `?paste=S-0001` opens the box for pasted rows. */
export default function OffersPage() {
  const { can } = useMe();
  const [params, setParams] = useSearchParams();
  const paste = params.get('paste');
  const set = (name: string, value: string | null) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        if (value === null || value === '') after.delete(name);
        else after.set(name, value);
        if (name !== 'paste') after.delete('page');
        return after;
      },
      { replace: true, preventScrollReset: true },
    );

  if (!can('prices.read')) {
    return (
      <>
        <PageHeader title="Offers" />
        <NoPrices />
      </>
    );
  }
  const edits = can('prices.edit');
  const supplier = params.get('supplier') ?? '';
  return (
    <>
      <PageHeader
        title="Offers"
        actions={
          edits && (
            <>
              <Button variant="outlined" onClick={() => set('paste', supplier || '1')}>
                Paste rows
              </Button>
              <Button variant="contained" component={Link} to="/add-offer">
                Add offer
              </Button>
            </>
          )
        }
      />
      <OffersTable more={<SupplierFilter value={supplier} onSet={(code) => set('supplier', code)} />} />
      {edits && paste !== null && (
        <PasteOffers supplier={/^S-\d+$/.test(paste) ? paste : ''} onClose={() => set('paste', null)} />
      )}
    </>
  );
}
