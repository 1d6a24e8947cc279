import { useMe } from '../../api/hooks/useMe';
import { LoadingRows } from '../../components/LoadingRows';
import { NoPermission } from '../../components/NoPermission';
import { PageHeader } from '../../components/PageHeader';
import { CountRoundView } from './count/CountRoundView';

/** Counting the shelves with a phone in the hand. */
export default function CountPage() {
  const { me, can } = useMe();
  if (!me || !can('stock.book')) {
    return (
      <>
        <PageHeader title="Count" />
        {me === undefined ? (
          <LoadingRows rows={4} label="Loading" />
        ) : (
          <NoPermission message="Librarians and purchasers count. An administrator can give you such a role." />
        )}
      </>
    );
  }
  return <CountRoundView userId={me.id} />;
}
