import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import MuiLink from '@mui/material/Link';
import Tab from '@mui/material/Tab';
import Tabs from '@mui/material/Tabs';
import { useState } from 'react';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { useTrain } from '../../api/hooks/useTrain';
import { asProblem } from '../../api/problem';
import type { Train } from '../../api/types';
import { Cautions } from '../../components/Cautions';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { PageHeader } from '../../components/PageHeader';
import { TrainStrip } from '../../drawings/TrainStrip';
import { BomTab } from './bom/BomTab';
import { DownloadBom } from './bom/DownloadBom';
import { DrawingTab } from './drawing/DrawingTab';
import { RecordTab } from './record/RecordTab';
import { StagesTab } from './stages/StagesTab';
import { TallyWords } from './TallyWords';
import { readTab, tallyOf, TRAIN_TABS, trainFacts, type TrainTab } from './trainWords';

/** `/trains/:code`: one train in four pages, the page held in the address. */
export default function TrainPage() {
  const { code = '' } = useParams();
  const { data: train, error, mutate } = useTrain(code);
  if (train) return <TrainInTabs train={train} />;
  if (error === undefined) return <LoadingRows rows={14} label="Loading the train" />;
  return <ErrorState problem={asProblem(error)} what="the train" onRetry={() => void mutate()} />;
}

function TrainInTabs({ train }: { train: Train }) {
  const [params, setParams] = useSearchParams();
  const { can } = useMe();
  const [refused, setRefused] = useState<string | null>(null);
  const tab = readTab(params.get('tab'));
  const show = (next: TrainTab) =>
    setParams(next === 'drawing' ? {} : { tab: next }, { preventScrollReset: true });
  return (
    <>
      <PageHeader
        code={train.code}
        title={train.title}
        figure={<TrainStrip train={train.spec} height={56} />}
        facts={
          <>
            {trainFacts(train).join(' · ')} · <TallyWords tally={tallyOf(train.figures)} />
            {train.brief && (
              <>
                {' · from '}
                <MuiLink
                  component={Link}
                  to={`/briefs/${encodeURIComponent(train.brief.id)}`}
                  sx={{ whiteSpace: 'nowrap' }}
                >
                  {train.brief.code}
                </MuiLink>
              </>
            )}
          </>
        }
        actions={
          can('bom.export') && (
            <DownloadBom
              code={train.code}
              variant={tab === 'bom' ? 'contained' : 'outlined'}
              onProblem={setRefused}
            />
          )
        }
      />
      {refused !== null && (
        <Alert severity="error" onClose={() => setRefused(null)} sx={{ mb: 1 }}>
          The workbook could not be downloaded. {refused}
        </Alert>
      )}
      <Tabs
        value={tab}
        onChange={(_, next: TrainTab) => show(next)}
        aria-label="Pages of this train"
        variant="scrollable"
        scrollButtons={false}
        sx={{ displayPrint: 'none' }}
      >
        {TRAIN_TABS.map(({ value, name }) => (
          <Tab key={value} value={value} label={name} id={`tab-${value}`} aria-controls="train-tab" />
        ))}
      </Tabs>
      <Box role="tabpanel" id="train-tab" aria-labelledby={`tab-${tab}`} sx={{ pt: 1.5 }}>
        {tab === 'drawing' && <DrawingTab train={train} canEdit={can('trains.edit')} />}
        {tab === 'stages' && <StagesTab train={train} canEdit={can('trains.edit')} />}
        {tab === 'bom' && <BomTab train={train} canExport={can('bom.export')} />}
        {tab === 'record' && <RecordTab key={train.code} train={train} canEdit={can('trains.edit')} />}
      </Box>
      <Cautions short={tab !== 'bom'} />
    </>
  );
}
