import { useNavigate, useSearchParams } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { addOffer } from '../../api/hooks/useOffer';
import { useSupplier } from '../../api/hooks/useSupplier';
import { LoadingRows } from '../../components/LoadingRows';
import { NoPermission } from '../../components/NoPermission';
import { useNotices } from '../../components/Notices';
import { PageHeader } from '../../components/PageHeader';
import { OfferEditor } from './OfferEditor';
import { newOfferForm, offerBody, type OfferForm } from './offerForm';

/** A new offer; `?part=` and `?supplier=` in the address fill in what is known already. */
export default function AddOfferPage() {
  const navigate = useNavigate();
  const [params] = useSearchParams();
  const { can } = useMe();
  const { tell } = useNotices();
  const part = params.get('part') ?? '';
  const code = params.get('supplier') ?? '';
  const { supplier, isLoading } = useSupplier(code === '' || !can('prices.edit') ? null : code);

  if (!can('prices.edit')) {
    return (
      <>
        <PageHeader title="Add an offer" />
        <NoPermission message="Adding offers needs the purchaser’s or the librarian’s role." />
      </>
    );
  }
  // The form starts with the supplier's currency.
  if (isLoading && supplier === undefined) {
    return (
      <>
        <PageHeader title="Add an offer" />
        <LoadingRows rows={8} label="Loading the supplier" />
      </>
    );
  }

  const save = async (form: OfferForm) => {
    const offer = await addOffer({
      ...offerBody(form),
      partNumber: form.partNumber.trim(),
      supplierCode: form.supplierCode,
    });
    tell(`Offer of ${offer.supplier.name} for ${offer.part.number} added.`);
    return () => void navigate(`/offers/${encodeURIComponent(offer.id)}`, { replace: true });
  };
  const back =
    part === ''
      ? code === ''
        ? '/offers'
        : `/suppliers/${encodeURIComponent(code)}`
      : `/parts/${encodeURIComponent(part)}`;

  return (
    <>
      <PageHeader title="Add an offer" />
      <OfferEditor
        start={newOfferForm({
          partNumber: part,
          ...(supplier ? { supplierCode: supplier.code, currency: supplier.currency } : {}),
        })}
        onSave={save}
        onCancel={() => void navigate(back)}
        saveName="Add the offer"
      />
    </>
  );
}
