import { asc, eq, inArray } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Reader } from '@/db/client';
import { companies } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { shipments } from '@/db/schema/shipments';
import { firstDayOfMonth, lastDayOfMonth, monthOf, nextMonth } from '@/shared/domain/calendar';
import { reckonStatement, type Statement } from '@/shared/domain/statement';
import type { ContentLine, ContentMovement, StatementContent } from '@/shared/domain/statement/content';
import { datedEvents } from '@/shared/domain/statement/late';
import { knownOf, plain } from './assessment-input';
import { creditsOf } from './credits';
import { earlierStatements } from './earlier-statements';
import { openDifferencesOf } from './open-differences-of';

type Partner = typeof companies.$inferSelect;
type Known = Awaited<ReturnType<typeof knownOf>>;
type Asked = { partner: Partner; month: string };

/** Everything that the partner's statement of the month says by what is known now; null when there is nothing to say. */
export async function draftContent(db: Reader, { partner, month }: Asked): Promise<StatementContent | null> {
  const known = await knownOf(db, partner);
  const statement = reckonStatement({
    month,
    taxBasis: { rate: plain(partner.taxRate), treatment: partner.taxTreatment },
    known: known.known,
    earlier: await earlierStatements(db, { companyId: partner.id, month }),
    closedMonths: monthsBefore(known, month),
    credits: await creditsOf(db, { companyId: partner.id, month }),
  });
  if (!saysAnything(statement)) return null;
  return contentOf(db, { partner, month, known, statement });
}

/** From the first month on which an event bears to the one before: months close in their order, so all are closed. */
function monthsBefore({ known }: Known, month: string): string[] {
  const first = datedEvents(known.events).reduce(
    (least, event) => (event.month < least ? event.month : least),
    month,
  );
  const all: string[] = [];
  for (let each = first; each < month; each = nextMonth(each)) all.push(each);
  return all;
}

function saysAnything({ assessment, lines, eventIds }: Statement): boolean {
  if (lines.length > 0 || eventIds.length > 0) return true;
  return assessment.lines.some(({ units }) => units.opening !== 0 || units.closing !== 0);
}

type Found = Asked & { known: Known; statement: Statement };

async function contentOf(db: Reader, found: Found): Promise<StatementContent> {
  const { partner, month, statement, known } = found;
  const { assessment, forfeits, taxRows, payable, tax, total } = statement;
  const codes = assessment.lines.map((line) => line.containerType);
  const [operator] = await db
    .select({ name: companies.name })
    .from(companies)
    .where(eq(companies.kind, 'operator'))
    .limit(1);
  return {
    version: 1,
    number: `${month}-${partner.code}`,
    month,
    from: firstDayOfMonth(month),
    to: lastDayOfMonth(month),
    currency: partner.currency,
    operator: { name: operator?.name ?? '' },
    partner: {
      id: partner.id,
      code: partner.code,
      name: partner.name,
      address: partner.address,
      taxRate: plain(partner.taxRate),
      taxTreatment: partner.taxTreatment,
      objectionDays: partner.objectionDays,
    },
    types: await typesOf(db, codes),
    terms: known.known.terms.filter(
      (terms) => codes.includes(terms.containerType) && terms.validFrom <= assessment.to,
    ),
    assessment,
    lines: linesOf(found),
    forfeits,
    taxRows,
    payable,
    tax,
    total,
    movements: await movementsOf(db, found),
    openDifferences: await openDifferencesOf(db, { partner, through: assessment.to }),
  };
}

async function typesOf(db: Reader, codes: readonly string[]) {
  if (codes.length === 0) return [];
  return db
    .select({ code: containerTypes.code, name: containerTypes.name, kind: containerTypes.kind })
    .from(containerTypes)
    .where(inArray(containerTypes.code, [...codes]))
    .orderBy(asc(containerTypes.code));
}

function linesOf({ known, statement }: Found): ContentLine[] {
  const causes = new Map(known.events.map((event) => [event.id, event.cause]));
  return statement.lines.map(({ correction, ...line }) => ({
    ...line,
    id: newId(),
    correction: correction && {
      billed: correction.billed,
      now: correction.now,
      causes: [...new Set(correction.causes.map((id) => causes.get(id) ?? ''))].filter(
        (cause) => cause !== '',
      ),
      eventIds: correction.causes,
    },
  }));
}

/** The movements of the month and the late ones, by date. */
async function movementsOf(db: Reader, { known, statement }: Found): Promise<ContentMovement[]> {
  const own = new Set(statement.eventIds);
  const late = new Set(statement.lateEventIds);
  const months = new Map(datedEvents(known.known.events).map((event) => [event.id, event.month]));
  const events = known.events.filter((event) => own.has(event.id) || late.has(event.id));
  const references = await referencesOf(db, events);
  const movements = events.map((event) => ({
    id: event.id,
    date: event.date,
    typeCode: event.typeCode,
    kind: event.kind,
    quantity: event.quantity,
    corrects: event.correctsId,
    reference: references.get(event.shipmentId ?? '') ?? null,
    shipmentId: event.shipmentId,
    cause: event.cause,
    lateFor: late.has(event.id) ? (months.get(event.id) ?? monthOf(event.date)) : null,
  }));
  return movements.sort((a, b) => (a.date < b.date ? -1 : a.date > b.date ? 1 : Number(a.id) - Number(b.id)));
}

async function referencesOf(
  db: Reader,
  events: readonly { shipmentId: string | null }[],
): Promise<Map<string, string>> {
  const ids = [...new Set(events.flatMap((event) => event.shipmentId ?? []))];
  if (ids.length === 0) return new Map();
  const rows = await db
    .select({ id: shipments.id, reference: shipments.reference })
    .from(shipments)
    .where(inArray(shipments.id, ids));
  return new Map(rows.map((row) => [row.id, row.reference]));
}
