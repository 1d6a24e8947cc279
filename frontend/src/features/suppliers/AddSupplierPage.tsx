import { useNavigate } from 'react-router-dom';
import { addSupplier } from '../../api/hooks/useSupplier';
import { useMe } from '../../api/hooks/useMe';
import { NoPermission } from '../../components/NoPermission';
import { useNotices } from '../../components/Notices';
import { PageHeader } from '../../components/PageHeader';
import { SupplierEditor } from './SupplierEditor';
import { inputOfSupplier, NEW_SUPPLIER, type SupplierForm } from './supplierForm';

export default function AddSupplierPage() {
  const navigate = useNavigate();
  const { can } = useMe();
  const { tell } = useNotices();

  const save = async (form: SupplierForm) => {
    const supplier = await addSupplier(inputOfSupplier(form));
    tell(`${supplier.code} ${supplier.name} added.`);
    return () => void navigate(`/suppliers/${encodeURIComponent(supplier.code)}`, { replace: true });
  };

  return (
    <>
      <PageHeader title="Add a supplier" />
      {can('prices.edit') ? (
        <SupplierEditor
          start={NEW_SUPPLIER}
          onSave={save}
          onCancel={() => void navigate('/suppliers')}
          saveName="Add the supplier"
        />
      ) : (
        <NoPermission message="Adding suppliers needs the purchaser’s or the librarian’s role." />
      )}
    </>
  );
}
