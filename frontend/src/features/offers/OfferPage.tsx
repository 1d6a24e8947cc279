import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import MuiLink from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { saveOffer, useOffer } from '../../api/hooks/useOffer';
import type { Offer } from '../../api/types';
import { CloseOrOpen } from '../../components/CloseOrOpen';
import { ErrorState } from '../../components/ErrorState';
import { formatWhen } from '../../components/figures';
import { LoadingRows } from '../../components/LoadingRows';
import { NoPrices } from '../../components/NoPermission';
import { useNotices } from '../../components/Notices';
import { PageHeader } from '../../components/PageHeader';
import { Sheet } from '../../components/Sheet';
import { OfferChanges } from './OfferChanges';
import { OfferEditor } from './OfferEditor';
import { formOfOffer, offerBody, type OfferForm } from './offerForm';
import { OfferPrices } from './OfferPrices';
import { OfferTerms } from './OfferTerms';

/** One supplier's price row for a part. */
export default function OfferPage() {
  const { id = '' } = useParams();
  const [params, setParams] = useSearchParams();
  const { can } = useMe();
  const { offer, problem, mutate } = useOffer(id);
  const { tell } = useNotices();
  const editing = params.get('edit') === '1' && can('prices.edit');
  const showEdit = (on: boolean) => setParams(on ? { edit: '1' } : {}, { replace: !on });

  if (offer === undefined) {
    const hidden = problem?.statusCode === 403;
    const back = (
      <MuiLink component={Link} to="/offers">
        All offers
      </MuiLink>
    );
    return (
      <>
        <PageHeader title="Offer" actions={problem === null || hidden ? undefined : back} />
        {problem === null ? (
          <LoadingRows rows={10} label="Loading the offer" />
        ) : hidden ? (
          <NoPrices />
        ) : (
          <ErrorState problem={problem} onRetry={() => void mutate()} what="the offer" />
        )}
      </>
    );
  }
  const show = (after: Offer) => void mutate(after, { revalidate: false });
  const title = `${offer.part.description}, from ${offer.supplier.name}`;

  if (editing) {
    const save = async (form: OfferForm, version: number) => {
      show(await saveOffer(offer.id, { ...offerBody(form), version }));
      tell('Offer saved.');
      return () => showEdit(false);
    };
    return (
      <>
        <PageHeader code={offer.part.number} title={title} facts="Editing the offer" />
        <OfferEditor
          key={offer.id}
          offer={offer}
          start={formOfOffer(offer)}
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
        code={offer.part.number}
        title={title}
        facts={`Offer · changed ${formatWhen(offer.updatedAt)} by ${offer.updatedBy}`}
        actions={
          can('prices.edit') && (
            <>
              <CloseOrOpen
                thing={offer}
                closed={offer.standing === 'closed'}
                name="this offer"
                save={(version, close) =>
                  saveOffer(offer.id, { version, standing: close ? 'closed' : 'open' })
                }
                onChanged={show}
              >
                <Typography>
                  It stays on record but will not be chosen any more. You can open it again.
                </Typography>
              </CloseOrOpen>
              <Button variant="contained" onClick={() => showEdit(true)}>
                Edit
              </Button>
            </>
          )
        }
      />
      <Box sx={{ display: 'flex', flexDirection: 'column', gap: 2 }}>
        {offer.tooOld && offer.standing === 'open' && (
          <Alert severity="warning">
            This price is {offer.ageDays} days old, more than the house rule allows. Ask the supplier again,
            then edit the price and the day on which it was stated.
          </Alert>
        )}
        <Box sx={factsSx}>
          <OfferPrices offer={offer} />
          <OfferTerms offer={offer} />
        </Box>
        {offer.note !== '' && (
          <Sheet title="Note">
            <Typography sx={{ whiteSpace: 'pre-wrap', overflowWrap: 'anywhere' }}>{offer.note}</Typography>
          </Sheet>
        )}
        <OfferChanges offer={offer} />
      </Box>
    </>
  );
}

const factsSx = {
  display: 'grid',
  gridTemplateColumns: { xs: 'minmax(0, 1fr)', md: 'minmax(0, 1.3fr) minmax(0, 1fr)' },
  gap: 2,
  alignItems: 'start',
} as const;
