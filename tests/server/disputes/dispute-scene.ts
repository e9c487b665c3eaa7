import { v7 as newId } from 'uuid';
import { eq } from 'drizzle-orm';
import { outbox } from '@/db/schema/work';
import { months, statementLines, statements } from '@/db/schema/statements';
import type { DisputeDetail } from '@/shared/contracts/disputes';
import type { LineComponent } from '@/shared/domain/statement/components';
import type { Caller } from '../../support/caller';
import { aScene } from '../differences/scene';

export const pdf = Buffer.from('%PDF-1.4\n1 0 obj<</Type/Catalog>>endobj\ntrailer<</Root 1 0 R>>\n%%EOF\n');

/** The scene of the differences, with a clerk of each partner, finance, and a paper in hand. */
export async function aDisputeScene(label: string) {
  const scene = await aScene(label);
  const { product, kestrel, orrin, operator, db } = scene;
  const person = async (company: { id: string }, role: 'clerk' | 'finance' | 'auditor', name: string) =>
    product.as(await product.aPerson(company, [role], { name }));
  const clerk = await person(kestrel, 'clerk', 'Mila Torv');
  const callers = {
    clerk,
    otherClerk: await person(orrin, 'clerk', 'Joost Aal'),
    finance: await person(operator, 'finance', 'Pia Lund'),
    auditor: await person(operator, 'auditor', 'Tor Vang'),
  };
  return {
    ...scene,
    ...callers,
    aPaper: async (caller: Caller, name = 'signed note.pdf'): Promise<string> => {
      const answer = await caller
        .form('/files')
        .attach('file', pdf, { filename: name, contentType: 'application/pdf' });
      return String(answer.body.id);
    },
    read: async (caller: Caller, id: string): Promise<DisputeDetail> => {
      const answer = await caller.get(`/disputes/${id}`);
      expect(answer.status).toBe(200);
      return answer.body as DisputeDetail;
    },
    answer: async (caller: Caller, id: string, body: Record<string, unknown>) => {
      const { messages } = (await caller.get(`/disputes/${id}`)).body as DisputeDetail;
      return caller.post(`/disputes/${id}/answers`, { seenMessageId: messages.at(-1)?.id, ...body });
    },
    letters: async () => (await db.select().from(outbox)).filter((letter) => letter.kind === 'dispute'),
    /** Another Kestrel with a type of its own, while February is open again. */
    afresh: async () => {
      await db.update(months).set({ state: 'open' }).where(eq(months.month, '2026-02'));
      const company = await product.aCompany({ name: 'Kestrel Coil Works' });
      const dock = await product.aSite(company, { name: 'Kestrel dock' });
      const type = await product.aType({ name: 'Tote 600×400' });
      await product.someTerms(company, type.code);
      return {
        kestrel: company,
        kestrelDock: dock,
        tote: type.code,
        clerk: await person(company, 'clerk', 'Mila Torv'),
      };
    },
    /** A statement of Kestrel for a closed month, as the issuing leaves it. */
    anIssuedStatement: async (given: GivenStatement) => {
      const { month, lines, objectionUntil = '2026-03-31', company = kestrel } = given;
      const id = newId();
      await db
        .insert(months)
        .values({ month, state: 'closed' })
        .onDuplicateKeyUpdate({ set: { state: 'closed' } });
      await db.insert(statements).values({
        id,
        companyId: company.id,
        month,
        number: `ST-${month}-${id.slice(-4)}`,
        currency: 'EUR',
        state: 'draft',
        payable: '0',
        tax: '0',
        content: {},
        sha256: 'a'.repeat(64),
        issuedAt: '2026-03-05T08:00:00.000Z',
        objectionUntil,
        answer: given.answer ?? 'awaited',
        createdAt: '2026-03-05T08:00:00.000Z',
      });
      const ids = lines.map(() => newId());
      await db.insert(statementLines).values(
        lines.map((line, index) => ({
          id: ids[index] ?? '',
          statementId: id,
          lineNo: index + 1,
          accountMonth: month,
          reckonedFrom: {},
          ...line,
        })),
      );
      await db.update(statements).set({ state: 'issued' }).where(eq(statements.id, id));
      return { id, lineIds: ids };
    },
  };
}

type GivenStatement = {
  month: string;
  company?: { id: string };
  objectionUntil?: string;
  answer?: 'awaited' | 'confirmed';
  lines: { component: LineComponent; typeCode: string; quantity: number; amount: string }[];
};

export type DisputeScene = Awaited<ReturnType<typeof aDisputeScene>>;
