import type { TrainSummary } from '../../api/types';
import { formatDay, formatFixed, formatSigned } from '../../components/figures';
import { VerdictWord } from '../../components/VerdictWord';
import { commonScale, TrainStrip } from '../../drawings/TrainStrip';
import { CodeLink } from './CodeLink';
import { RowTable, type RowColumn } from './RowTable';

const pathOf = (train: TrainSummary) => `/trains/${encodeURIComponent(train.code)}`;
const STRIP = { height: 36, width: 96 };

function columns(mmPerPixel: number): RowColumn<TrainSummary>[] {
  return [
    { name: 'Train', cell: (train) => <CodeLink to={pathOf(train)} code={train.code} /> },
    {
      name: 'One scale',
      wideOnly: true,
      cell: (train) => <TrainStrip train={train.spec} {...STRIP} mmPerPixel={mmPerPixel} />,
    },
    { name: 'Title', cell: (train) => `${train.title}, revision ${train.revision}, ${train.state}` },
    { name: 'Ratio', figure: true, cell: (train) => formatFixed(train.ratio.value, 3) },
    {
      name: 'Error %',
      figure: true,
      wideOnly: true,
      cell: (train) => formatSigned(train.ratio.errorPercent, 3),
    },
    { name: 'Mass kg', figure: true, wideOnly: true, cell: (train) => formatFixed(train.mass, 2) },
    {
      name: 'Checks',
      cell: ({ fails, marginals }) =>
        fails > 0 ? (
          <>
            {fails} <VerdictWord verdict="fails" />
          </>
        ) : marginals > 0 ? (
          <>
            {marginals} <VerdictWord verdict="marginal" />
          </>
        ) : (
          <VerdictWord verdict="passes" />
        ),
    },
    { name: 'Changed', figure: true, wideOnly: true, cell: (train) => formatDay(train.updatedAt) },
  ];
}

interface TrainRowsProps {
  label: string;
  trains: readonly TrainSummary[];
  /** One more column at the end. */
  last?: RowColumn<TrainSummary>;
}

export function TrainRows({ label, trains, last }: TrainRowsProps) {
  const scale = commonScale(
    trains.map(({ spec }) => spec),
    STRIP.height,
    STRIP.width,
  );
  return (
    <RowTable
      label={label}
      columns={last === undefined ? columns(scale) : [...columns(scale), last]}
      rows={trains}
      keyOf={(train) => train.code}
      pathOf={pathOf}
    />
  );
}
