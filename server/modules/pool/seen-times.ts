import { sql } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import type { SeenTimes } from '@/shared/contracts/pool-sizing';
import { addDays, compareDays } from '@/shared/domain/calendar';
import { isWeekday, weekdaysBetween } from '@/shared/domain/working-days';

const windowDays = 60;
type Window = { typeCode: string; from: string; to: string };
type Side = 'partner' | 'operator';

/**
 * What the book saw of a loop over the last 60 days, in working days. The ways by their shipments, left to counted.
 * The stocks by Little's law: average units standing ÷ units that left a working day; idle stock counts in it.
 */
export async function seenTimesOf(db: Reader, typeCode: string, today: string): Promise<SeenTimes> {
  const first = await firstDay(db, typeCode);
  const earliest = addDays(today, 1 - windowDays);
  const from = first !== null && compareDays(first, earliest) > 0 ? first : earliest;
  const window = { typeCode, from, to: today };
  const workingDays = weekdaysBetween(addDays(from, -1), today);
  const [ways, out, average] = [
    await waysOf(db, window),
    await unitsOut(db, window),
    await averageStanding(db, window),
  ];
  const stock = (stretch: 'at the partner' | 'at the plant', side: Side) => {
    const perDay = workingDays > 0 ? out[side] / workingDays : 0;
    // A stock that the book has below zero is not what stood there.
    const days = perDay > 0 && average[side] >= 0 ? average[side] / perDay : null;
    return { stretch, days, sd: null, shipments: null, units: average[side], unitsOut: out[side] };
  };
  return {
    from,
    to: today,
    workingDays,
    stretches: [
      stock('at the partner', 'partner'),
      { stretch: 'to the plant', ...ways.fulls, unitsOut: null },
      stock('at the plant', 'operator'),
      { stretch: 'back', ...ways.empties, unitsOut: null },
    ],
  };
}

async function rowsOf<Row>(db: Reader, query: ReturnType<typeof sql>): Promise<Row[]> {
  const [rows] = await db.execute(query);
  return rows as unknown as Row[];
}

async function firstDay(db: Reader, typeCode: string): Promise<string | null> {
  const [row] = await rowsOf<{ day: string | null }>(
    db,
    sql`select min(n.day) as day from daily_nets n join accounts a on a.id = n.account_id
        where a.kind = 'site' and n.type_code = ${typeCode}`,
  );
  return row?.day ?? null;
}

type Way = { days: number | null; sd: number | null; shipments: number; units: number };
type Counted = {
  contents: 'fulls' | 'empties';
  left: string;
  counted: string;
  shipments: string;
  units: string;
};

/** Each unit's time on the way; shipments that nobody declared or nobody counted by hand say nothing of it. */
async function waysOf(db: Reader, { typeCode, from, to }: Window): Promise<Record<'fulls' | 'empties', Way>> {
  const rows = await rowsOf<Counted>(
    db,
    sql`select s.contents as contents, s.left_on as \`left\`, s.counted_on as counted, count(*) as shipments, sum(l.counted) as units
        from shipments s join counts c on c.shipment_id = s.id and c.sequence = 1 and c.source <> 'automatic'
        join count_lines l on l.count_id = c.id and l.type_code = ${typeCode}
        join companies f on f.id = s.from_company_id join companies t on t.id = s.to_company_id
        where s.state = 'counted' and s.counted_on between ${from} and ${to} and s.origin <> 'unannounced' and l.counted > 0
          and ((s.contents = 'fulls' and t.kind = 'operator') or (s.contents = 'empties' and f.kind = 'operator'))
        group by s.contents, s.left_on, s.counted_on`,
  );
  const of = (contents: Counted['contents']) => wayOf(rows.filter((row) => row.contents === contents));
  return { fulls: of('fulls'), empties: of('empties') };
}

function wayOf(rows: readonly Counted[]): Way {
  const each = rows.map((row) => ({
    days: weekdaysBetween(row.left, row.counted),
    units: Number(row.units),
  }));
  const shipments = rows.reduce((sum, row) => sum + Number(row.shipments), 0);
  const units = each.reduce((sum, way) => sum + way.units, 0);
  if (units === 0) return { days: null, sd: null, shipments: 0, units: 0 };
  const mean = each.reduce((sum, way) => sum + way.days * way.units, 0) / units;
  const variance = each.reduce((sum, way) => sum + (way.days - mean) ** 2 * way.units, 0) / units;
  return { days: mean, sd: Math.sqrt(variance), shipments, units };
}

/** Units that left the partners as fulls, and the plants as empties. */
async function unitsOut(db: Reader, { typeCode, from, to }: Window): Promise<Record<Side, number>> {
  const rows = await rowsOf<{ kind: Side; units: string }>(
    db,
    sql`select f.kind as kind, sum(l.declared) as units from shipments s
        join shipment_lines l on l.shipment_id = s.id and l.type_code = ${typeCode}
        join companies f on f.id = s.from_company_id
        where s.left_on between ${from} and ${to} and s.contents = if(f.kind = 'partner', 'fulls', 'empties')
        group by f.kind`,
  );
  const of = (side: Side) => Number(rows.find((row) => row.kind === side)?.units ?? 0);
  return { partner: of('partner'), operator: of('operator') };
}

/** Units standing at the end of a working day, on average over the window. */
async function averageStanding(db: Reader, { typeCode, from, to }: Window): Promise<Record<Side, number>> {
  const before = addDays(from, -1);
  const rows = await rowsOf<{ kind: Side; day: string; net: string }>(
    db,
    sql`select c.kind as kind, greatest(n.day, ${before}) as day, sum(n.net) as net from daily_nets n
        join accounts a on a.id = n.account_id and a.kind = 'site' join companies c on c.id = a.company_id
        where n.type_code = ${typeCode} and n.day <= ${to}
        group by c.kind, greatest(n.day, ${before})`,
  );
  const of = (side: Side) => {
    const nets = new Map(rows.filter((row) => row.kind === side).map((row) => [row.day, Number(row.net)]));
    let standing = nets.get(before) ?? 0;
    let sum = 0;
    let days = 0;
    for (let day = from; compareDays(day, to) <= 0; day = addDays(day, 1)) {
      standing += nets.get(day) ?? 0;
      if (!isWeekday(day)) continue;
      sum += standing;
      days += 1;
    }
    return days === 0 ? 0 : sum / days;
  };
  return { partner: of('partner'), operator: of('operator') };
}
