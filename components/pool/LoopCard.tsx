import type { ReckonedPool } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';
import { longestOverrun, type LoopRow, loopRows } from './loop-rows';
import { manyOf, type Pool } from './pool-answer';
import { PlanFields } from './PlanFields';
import { SeenReckoning } from './SeenReckoning';
import type { PlanEditing } from './use-plan-editing';

const words = text.pool;

type Props = { pool: Pool; reckoned: ReckonedPool; editing: PlanEditing };

/** The loop leg by leg beside what the book saw, and the few assumptions that are turned here. */
export function LoopCard({ pool, reckoned, editing }: Props) {
  const loop = {
    legs: editing.plan.legs,
    perDay: reckoned.result.containersPerDay,
    seen: pool.seen,
  };
  const overrun = longestOverrun(loop);
  return (
    <Card title={words.loop(reckoned.result.loopDays)}>
      <LoopSheet
        rows={loopRows(loop, (stretch) => words.together[stretch])}
        pool={pool}
        reckoned={reckoned}
      />
      {overrun === undefined ? null : (
        <Text tone="differs">
          {words.longer(words.where[overrun.stretch], {
            days: overrun.days,
            units: overrun.units,
            many: manyOf(pool),
          })}
        </Text>
      )}
      {editing.mayPlan ? (
        <PlanFields editing={editing} />
      ) : (
        <Text variant="soft">
          {words.assumed({ ...editing.plan, travel: text.parts.assume[editing.plan.travel] })}
        </Text>
      )}
      {editing.mayPlan ? <Link href={`/parts/loops/${pool.type.code}`} label={words.changeLoop} /> : null}
      <SeenReckoning seen={pool.seen} />
    </Card>
  );
}

type SheetProps = { rows: readonly LoopRow[]; pool: Pool; reckoned: ReckonedPool };

function LoopSheet({ rows, pool, reckoned }: SheetProps) {
  const { result } = reckoned;
  const softened = (row: LoopRow) => (row.together ? { tone: 'soft' as const } : {});
  return (
    <Sheet<LoopRow>
      caption={words.loopCaption}
      hideCaption
      rows={rows}
      rowKey={(row) => row.key}
      columns={[
        {
          key: 'name',
          head: words.leg.name,
          cell: (row) => <Text {...softened(row)}>{row.name}</Text>,
        },
        {
          key: 'days',
          head: words.leg.days,
          align: 'end',
          cell: (row) => <Figure number={row.days} plain {...softened(row)} />,
        },
        {
          key: 'sd',
          head: words.leg.sd,
          align: 'end',
          cell: (row) => (row.together ? null : <Figure number={row.sd} plain />),
        },
        {
          key: 'seen',
          head: words.leg.seen,
          align: 'end',
          cell: (row) =>
            row.longer ? (
              <Figure number={row.seen} tone="differs" />
            ) : (
              <Figure number={row.seen} plain tone="soft" />
            ),
        },
        {
          key: 'units',
          head: capital(manyOf(pool)),
          align: 'end',
          cell: (row) => <Figure units={Math.round(row.units)} plain {...softened(row)} />,
        },
      ]}
      sum={{
        name: words.average,
        days: <Figure number={result.loopDays} />,
        units: <Figure units={Math.round(result.averageInLoop)} />,
      }}
    />
  );
}

const capital = (word: string) => word.charAt(0).toUpperCase() + word.slice(1);
