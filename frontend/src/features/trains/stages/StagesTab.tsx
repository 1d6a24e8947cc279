import Box from '@mui/material/Box';
import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import { useSearchParams } from 'react-router-dom';
import { gearPlace } from '../../../api/hooks/useFittingGears';
import type { Train } from '../../../api/types';
import { EmptyState } from '../../../components/EmptyState';
import { Sheet } from '../../../components/Sheet';
import { MeshDrawing } from '../../../drawings/MeshDrawing';
import { ChecksTable } from './ChecksTable';
import { FindingsList } from './FindingsList';
import { GearTable } from './GearTable';
import { MeshTable } from './MeshTable';

/** One stage at a time: the mesh drawn, both gears' data, every mesh figure, checks and findings. */
export function StagesTab({ train, canEdit }: { train: Train; canEdit: boolean }) {
  const [params, setParams] = useSearchParams();
  const count = train.spec.stages.length;
  const asked = Number(params.get('stage') ?? 1);
  const index = Number.isInteger(asked) && asked >= 1 && asked <= count ? asked - 1 : 0;
  const whole = params.get('view') === 'whole';
  const set = (name: string, value: string | null) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        if (value === null) after.delete(name);
        else after.set(name, value);
        return after;
      },
      { replace: true, preventScrollReset: true },
    );

  const stage = train.spec.stages[index];
  const mesh = train.figures.meshes[index];
  const pinion = gearPlace(train.spec, index, 'pinion');
  const wheel = gearPlace(train.spec, index, 'wheel');
  if (!stage || !mesh || !pinion || !wheel) return <EmptyState title="This train has no stages." />;
  const ofStage = <T extends { stage?: number }>(items: T[]) => items.filter((item) => item.stage === index);

  return (
    <>
      <Box sx={{ display: 'flex', gap: 2, mb: 1, flexWrap: 'wrap', displayPrint: 'none' }}>
        <ToggleButtonGroup
          exclusive
          size="small"
          aria-label="Stage"
          value={index}
          onChange={(_, next: number | null) =>
            next !== null && set('stage', next === 0 ? null : String(next + 1))
          }
        >
          {train.spec.stages.map(({ pinion: p, wheel: w }, each) => (
            <ToggleButton key={each} value={each}>
              {`Stage ${each + 1}, ${p.teeth}/${w.teeth}`}
            </ToggleButton>
          ))}
        </ToggleButtonGroup>
        <ToggleButtonGroup
          exclusive
          size="small"
          aria-label="View"
          value={whole ? 'whole' : 'mesh'}
          onChange={(_, next: string | null) =>
            next !== null && set('view', next === 'whole' ? 'whole' : null)
          }
        >
          <ToggleButton value="mesh">Close up</ToggleButton>
          <ToggleButton value="whole">Both gears</ToggleButton>
        </ToggleButtonGroup>
      </Box>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 360px' },
          gap: 2,
          alignItems: 'start',
        }}
      >
        <Box sx={{ display: 'grid', gap: 2, minWidth: 0 }}>
          <Sheet flush>
            <MeshDrawing
              pinion={pinion}
              wheel={wheel}
              centreDistance={stage.centreDistance}
              view={whole ? 'whole' : 'mesh'}
            />
          </Sheet>
          <Box
            sx={{
              display: 'grid',
              gridTemplateColumns: 'repeat(auto-fit, minmax(min(100%, 370px), 1fr))',
              gap: 2,
              alignItems: 'start',
            }}
          >
            <MeshTable
              mesh={mesh}
              teeth={[stage.pinion.teeth, stage.wheel.teeth]}
              leastContactRatio={train.spec.leastContactRatio}
            />
            <Box sx={{ display: 'grid', gap: 2, minWidth: 0 }}>
              <Sheet title="Checks of this stage" flush>
                <ChecksTable checks={ofStage(train.figures.checks)} />
              </Sheet>
              <FindingsList
                findings={ofStage(train.figures.findings)}
                none="The geometry has nothing to remark on this pair."
              />
            </Box>
          </Box>
        </Box>
        <GearTable train={train} stage={index} canEdit={canEdit} />
      </Box>
    </>
  );
}
