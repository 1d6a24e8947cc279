import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { PRESSURE_ANGLES_DEG } from '@stageyard/libs/gear-geometry';
import { useFormContext, useWatch } from 'react-hook-form';
import { dutyWords } from '../briefWords';
import type { BriefForm } from './briefForm';
import { ChoiceField } from './ChoiceField';
import { FigureField, RangeFields } from './FigureField';
import { FormSection, WholeRow } from './FormSection';
import { ModulesField } from './ModulesField';
import { FieldRemarks, useRemarks } from './remarks';
import { BEST_OF_WORDS, DIRECTION_WORDS, OBJECTIVE_WORDS, SHIFT_WORDS, UNDERCUT_WORDS } from '../choiceWords';

const choicesOf = (words: Record<string, string>) =>
  Object.entries(words).map(([value, text]) => ({ value, words: text }));

const STAGES = ['1', '2', '3'].map((value) => ({ value, words: value }));
const ANGLES = PRESSURE_ANGLES_DEG.map((angle) => ({ value: String(angle), words: `${angle}°` }));

/** Every field of a brief, group by group. */
export function BriefFields() {
  return (
    <>
      <FormSection title="Brief">
        <WholeRow>
          <TextLine field="title" label="Title" />
        </WholeRow>
        <WholeRow>
          <TextLine field="note" label="Note" multiline />
        </WholeRow>
      </FormSection>
      <FormSection title="Ratio">
        <FigureField field="ratioTarget" unit=": 1" />
        <FigureField field="tolerancePercent" unit="± %" />
        <StageCountFields />
        <ChoiceField field="direction" choices={choicesOf(DIRECTION_WORDS)} />
        <ChoiceField field="objective" choices={choicesOf(OBJECTIVE_WORDS)} />
        <FigureField field="limit" />
        <ChoiceField field="bestOf" choices={choicesOf(BEST_OF_WORDS)} />
      </FormSection>
      <FormSection title="Teeth">
        <RangeFields from="pinionMin" to="pinionMax" title="Pinion" />
        <RangeFields from="wheelMin" to="wheelMax" title="Wheel" />
        <RangeFields from="stageRatioMin" to="stageRatioMax" title="Stage ratio" openEnd />
      </FormSection>
      <FormSection title="Gears">
        <WholeRow>
          <ModulesField />
        </WholeRow>
        <ChoiceField field="pressureAngleDeg" choices={ANGLES} />
        <FigureField field="helixAngleDeg" unit="°" />
        <FigureField field="faceWidthFactor" unit="× module" />
        <ChoiceField field="shiftPolicy" choices={choicesOf(SHIFT_WORDS)} />
        <ChoiceField field="undercut" choices={choicesOf(UNDERCUT_WORDS)} />
      </FormSection>
      <FormSection title="Mesh" remark="The contact ratio is asked for at the widest centre distance.">
        <FigureField field="leastContactRatio" />
        <FigureField field="centreDistanceAllowance" unit="modules" />
      </FormSection>
      <FormSection title="Box" remark="Outside, in line. Leave a side blank for no limit." dense>
        <FigureField field="envelopeLength" label="Length" unit="mm" placeholder="no limit" />
        <FigureField field="envelopeWidth" label="Width along shafts" unit="mm" placeholder="no limit" />
        <FigureField field="envelopeHeight" label="Height" unit="mm" placeholder="no limit" />
        <FigureField field="envelopeWall" label="Wall" unit="mm" />
      </FormSection>
      <FormSection
        title="Duty"
        remark="Strength is not rated yet: the duty only sizes the shafts and rules no option out."
      >
        <FigureField field="inputSpeed" unit="rpm" />
        <FigureField field="outputTorque" unit="N·m" />
        <FigureField field="applicationFactor" />
        <WholeRow>
          <DutyLine />
        </WholeRow>
      </FormSection>
      <FormSection
        title="Buying"
        remark="With a build quantity the options show what their gears cost and what lies on the shelf."
      >
        <FigureField field="buildQuantity" unit="trains" placeholder="not named" />
      </FormSection>
    </>
  );
}

function StageCountFields() {
  const remarks = [...useRemarks('stagesMin'), ...useRemarks('stagesMax')];
  return (
    <div role="group" aria-label="Stages">
      <div style={{ display: 'grid', gridTemplateColumns: '1fr 1fr', columnGap: 8 }}>
        <ChoiceField field="stagesMin" label="Stages from" choices={STAGES} bare />
        <ChoiceField field="stagesMax" label="to" choices={STAGES} bare />
      </div>
      <FieldRemarks id="remarks-stagesMin" remarks={remarks} />
    </div>
  );
}

function TextLine({
  field,
  label,
  multiline,
}: {
  field: 'title' | 'note';
  label: string;
  multiline?: boolean;
}) {
  const { register, formState } = useFormContext<BriefForm>();
  const remarks = useRemarks(field);
  return (
    <div>
      <TextField
        id={`brief-${field}`}
        label={label}
        fullWidth
        multiline={multiline}
        minRows={multiline ? 2 : undefined}
        error={formState.errors[field] !== undefined || remarks.length > 0}
        {...register(field)}
      />
      <FieldRemarks id={`remarks-${field}`} remarks={remarks} />
    </div>
  );
}

/** What the duty comes to at the output, as far as it is known. */
function DutyLine() {
  const [inputSpeed, outputTorque, ratioTarget] = useWatch<
    BriefForm,
    ['inputSpeed', 'outputTorque', 'ratioTarget']
  >({
    name: ['inputSpeed', 'outputTorque', 'ratioTarget'],
  });
  const words = dutyWords({ inputSpeed, outputTorque, ratioTarget });
  return words === null ? null : (
    <Typography variant="body2" color="textSecondary">
      {words}
    </Typography>
  );
}
