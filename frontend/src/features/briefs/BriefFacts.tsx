import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { formatModule, formatTrimmed } from '@stageyard/libs/units';
import type { Brief, Requirement } from '../../api/types';
import { formatCount, formatWhen } from '../../components/figures';
import { BEST_OF_WORDS, DIRECTION_WORDS, OBJECTIVE_WORDS, SHIFT_WORDS, UNDERCUT_WORDS } from './choiceWords';

/** The whole brief to read, for everybody: the same groups as the form, without fields. */
export function BriefFacts({ brief }: { brief: Brief }) {
  return (
    <Box
      component="section"
      aria-label="Brief in full"
      sx={{
        bgcolor: 'background.paper',
        border: '1px solid',
        borderColor: 'line.rule',
        px: 2,
        py: 1.5,
        mb: 1.5,
      }}
    >
      {brief.note !== '' && <Typography sx={{ mb: 1, whiteSpace: 'pre-line' }}>{brief.note}</Typography>}
      <Box
        component="dl"
        sx={{
          m: 0,
          display: 'grid',
          gridTemplateColumns: { xs: '1fr', sm: 'repeat(2, 1fr)', lg: 'repeat(3, 1fr)' },
          columnGap: 4,
        }}
      >
        {facts(brief.requirement).map(([name, words]) => (
          <Box
            key={name}
            sx={{
              display: 'flex',
              justifyContent: 'space-between',
              gap: 2,
              py: 0.5,
              borderBottom: '1px solid',
              borderColor: 'line.rule',
            }}
          >
            <Typography component="dt" variant="body2" color="textSecondary">
              {name}
            </Typography>
            <Typography component="dd" variant="body2" sx={{ m: 0, textAlign: 'right' }}>
              {words}
            </Typography>
          </Box>
        ))}
      </Box>
      <Typography variant="body2" color="textSecondary" sx={{ mt: 1 }}>
        Version {brief.version}, saved {formatWhen(brief.updatedAt)}. Strength is not rated yet; the duty only
        sizes the shafts.
      </Typography>
    </Box>
  );
}

function facts(requirement: Requirement): [string, string][] {
  const { ratio, stages, teeth, stageRatio, envelope, duty } = requirement;
  const range = ({ min, max }: { min: number; max: number }) =>
    min === max ? String(min) : `${min} to ${max}`;
  const side = (value: number | undefined) => (value === undefined ? 'any' : formatTrimmed(value, 2));
  const list: [string, string][] = [
    ['Ratio', `${ratio.target} : 1 ± ${ratio.tolerancePercent} %`],
    ['Stages', range(stages)],
    ['Output turns', DIRECTION_WORDS[requirement.direction ?? 'any']],
    ['Best by', OBJECTIVE_WORDS[requirement.objective]],
    [
      'Options kept',
      `${requirement.limit ?? 50}, the best ${BEST_OF_WORDS[requirement.bestOf ?? 'all'].toLowerCase()}`,
    ],
    ['Pinion teeth', range(teeth.pinion)],
    ['Wheel teeth', range(teeth.wheel)],
    ['Stage ratio', `${stageRatio?.min ?? 1} to ${stageRatio?.max ?? 'no limit'}`],
    ['Modules', requirement.modules.map((module) => formatModule(module)).join(', ')],
    ['Pressure angle', `${requirement.pressureAngleDeg ?? 20}°`],
    ['Helix angle', `${requirement.helixAngleDeg ?? 0}°`],
    ['Face width', `${requirement.faceWidthFactor ?? 10} × module`],
    ['Profile shift', SHIFT_WORDS[requirement.shiftPolicy ?? 'none']],
    ['Undercut', UNDERCUT_WORDS[requirement.undercut ?? 'allow']],
    ['Least contact ratio', String(requirement.leastContactRatio ?? 1.2)],
    ['Centre-distance allowance', `${requirement.centreDistanceAllowance ?? 0} modules`],
    [
      'Box, length × width × height',
      envelope
        ? `${side(envelope.length)} × ${side(envelope.width)} × ${side(envelope.height)} mm, wall ${side(envelope.wall)} mm`
        : 'no limit',
    ],
  ];
  if (duty?.inputSpeed !== undefined) list.push(['Input speed', `${formatCount(duty.inputSpeed)} rpm`]);
  if (duty?.outputTorque !== undefined)
    list.push(['Output torque', `${formatTrimmed(duty.outputTorque, 2)} N·m`]);
  if (duty?.applicationFactor !== undefined)
    list.push(['Application factor', String(duty.applicationFactor)]);
  if (requirement.buildQuantity !== undefined)
    list.push(['Build quantity', `${formatCount(requirement.buildQuantity)} trains`]);
  return list;
}
