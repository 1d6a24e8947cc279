import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import MuiLink from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { saveSupplier, useSupplier } from '../../api/hooks/useSupplier';
import type { Supplier } from '../../api/types';
import { CloseOrOpen } from '../../components/CloseOrOpen';
import { ErrorState } from '../../components/ErrorState';
import { formatWhen } from '../../components/figures';
import { LoadingRows } from '../../components/LoadingRows';
import { NoPrices } from '../../components/NoPermission';
import { useNotices } from '../../components/Notices';
import { OffersTable } from '../../components/offers/OffersTable';
import { PageHeader } from '../../components/PageHeader';
import { Sheet } from '../../components/Sheet';
import { SupplierChanges } from './SupplierChanges';
import { SupplierContacts } from './SupplierContacts';
import { SupplierEditor } from './SupplierEditor';
import { formOfSupplier, inputOfSupplier, type SupplierForm } from './supplierForm';
import { SupplierTerms } from './SupplierTerms';

/** One supplier: whom to ask, on what terms they sell, all they offer. */
export default function SupplierPage() {
  const { code = '' } = useParams();
  const [params, setParams] = useSearchParams();
  const { can } = useMe();
  const { supplier, problem, mutate } = useSupplier(code);
  const { tell } = useNotices();
  const editing = params.get('edit') === '1' && can('prices.edit');
  const showEdit = (on: boolean) => setParams(on ? { edit: '1' } : {}, { replace: !on });

  if (supplier === undefined) {
    const hidden = problem?.statusCode === 403;
    const back = (
      <MuiLink component={Link} to="/suppliers">
        All suppliers
      </MuiLink>
    );
    return (
      <>
        <PageHeader title={code} actions={problem === null || hidden ? undefined : back} />
        {problem === null ? (
          <LoadingRows rows={10} label="Loading the supplier" />
        ) : hidden ? (
          <NoPrices />
        ) : (
          <ErrorState problem={problem} onRetry={() => void mutate()} what={`supplier ${code}`} />
        )}
      </>
    );
  }
  const show = (after: Supplier) => void mutate(after, { revalidate: false });

  if (editing) {
    const save = async (form: SupplierForm, version: number) => {
      show(await saveSupplier(supplier.code, { ...inputOfSupplier(form), version }));
      tell(`${supplier.code} saved.`);
      return () => showEdit(false);
    };
    return (
      <>
        <PageHeader code={supplier.code} title={supplier.name} facts="Editing" />
        <SupplierEditor
          key={supplier.id}
          supplier={supplier}
          start={formOfSupplier(supplier)}
          onSave={save}
          onCancel={() => showEdit(false)}
          saveName="Save changes"
        />
      </>
    );
  }
  return (
    <>
      <PageHeader
        code={supplier.code}
        title={supplier.name}
        facts={`${supplier.standing} · changed ${formatWhen(supplier.updatedAt)} by ${supplier.updatedBy}`}
        actions={
          can('prices.edit') && (
            <SupplierActions supplier={supplier} onEdit={() => showEdit(true)} onChanged={show} />
          )
        }
      />
      <Box sx={{ display: 'flex', flexDirection: 'column', gap: 2 }}>
        <Box sx={factsSx}>
          <Box sx={{ display: 'flex', flexDirection: 'column', gap: 2, minWidth: 0 }}>
            <SupplierContacts contacts={supplier.contacts} />
            {supplier.note !== '' && (
              <Sheet title="Note">
                <Typography sx={{ whiteSpace: 'pre-wrap', overflowWrap: 'anywhere' }}>
                  {supplier.note}
                </Typography>
              </Sheet>
            )}
          </Box>
          <SupplierTerms supplier={supplier} />
        </Box>
        <Box component="section" aria-labelledby="supplier-offers">
          <Typography variant="h2" id="supplier-offers" sx={{ mb: 0.75 }}>
            Offers
          </Typography>
          <OffersTable supplier={supplier.code} height="560px" />
        </Box>
        <SupplierChanges supplier={supplier} />
      </Box>
    </>
  );
}

const factsSx = {
  display: 'grid',
  gridTemplateColumns: { xs: 'minmax(0, 1fr)', md: 'minmax(0, 1.5fr) minmax(0, 1fr)' },
  gap: 2,
  alignItems: 'start',
} as const;

interface SupplierActionsProps {
  supplier: Supplier;
  onEdit: () => void;
  onChanged: (after: Supplier) => void;
}

function SupplierActions({ supplier, onEdit, onChanged }: SupplierActionsProps) {
  const { code, standing, offers } = supplier;
  const closed = standing === 'closed';
  return (
    <>
      <CloseOrOpen
        thing={supplier}
        closed={closed}
        name={code}
        save={(version, close) => saveSupplier(code, { version, standing: close ? 'closed' : 'active' })}
        onChanged={onChanged}
      >
        <Typography>
          {offers.open === 0
            ? 'It stays on record and takes no new offers.'
            : `Its ${offers.open === 1 ? 'open offer stays' : `${offers.open} open offers stay`} on record but will not be chosen any more.`}{' '}
          You can open it again.
        </Typography>
      </CloseOrOpen>
      <Button variant="outlined" onClick={onEdit}>
        Edit
      </Button>
      {!closed && (
        <>
          <Button variant="outlined" component={Link} to={`/offers?paste=${encodeURIComponent(code)}`}>
            Paste offers
          </Button>
          <Button variant="contained" component={Link} to={`/add-offer?supplier=${encodeURIComponent(code)}`}>
            Add offer
          </Button>
        </>
      )}
    </>
  );
}
