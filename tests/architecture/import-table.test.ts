import { execFileSync } from 'node:child_process';

/** Every row of the import table in DEVELOPERS.md: a wrong import is refused, the right one beside it passes. */
const wrong: [file: string, code: string][] = [
  ['app/(keep)/index.tsx', "import { createApp } from '@/server/app';"],
  ['app/(keep)/index.tsx', "import { poolOf } from '@/db/client';"],
  ['app/(keep)/index.tsx', "import { z } from 'zod';"],
  ['app/(keep)/index.tsx', "import { Text } from 'react-native';"],
  ['components/shipments/CountScreen.tsx', "import { createApp } from '@/server/app';"],
  ['components/shipments/CountScreen.tsx', "import { shipments } from '../../db/schema/shipments';"],
  ['components/shipments/CountScreen.tsx', "import { readFile } from 'node:fs';"],
  ['components/shipments/CountScreen.tsx', "import { Text } from 'react-native';"],
  [
    'components/shipments/CountScreen.tsx',
    "import { StatementScreen } from '../statements/StatementScreen';",
  ],
  [
    'components/shipments/CountScreen.tsx',
    "import { StatementScreen } from '@/components/statements/StatementScreen';",
  ],
  ['shared/contracts/shipments.ts', "import { poolOf } from '@/db/client';"],
  ['shared/contracts/shipments.ts', "import { useQuery } from '@tanstack/react-query';"],
  ['shared/contracts/shipments.ts', "import { readFile } from 'node:fs';"],
  ['shared/domain/assessment.ts', "import { text } from '../text/catalogue';"],
  ['shared/domain/assessment/layers.ts', "import { text } from '../../text/catalogue';"],
  ['shared/domain/assessment.ts', "import { text } from '@/shared/text/catalogue';"],
  ['shared/domain/assessment.ts', 'export const today = () => new Date();'],
  ['shared/domain/assessment.ts', 'export const now = () => Date.now();'],
  ['shared/domain/assessment.ts', 'export const lot = () => Math.random();'],
  ['shared/domain/assessment.ts', 'export const flag = process.env.TEST;'],
  ['server/app.ts', "import { Button } from '@/components/ui/Button';"],
  ['server/app.ts', "import { useState } from 'react';"],
  ['server/modules/shipments/read-model.ts', "import { disputeRoutes } from '../disputes/router';"],
  ['db/client.ts', "import { createApp } from '@/server/app';"],
  ['db/client.ts', "import express from 'express';"],
  ['server/modules/shipments/states.ts', 'export enum State { Open }'],
  ['server/modules/shipments/states.ts', 'export default function send() {}'],
  ['server/modules/shipments/states.ts', 'export const any = (value: any) => value;'],
];

const right: [file: string, code: string][] = [
  ['app/(keep)/index.tsx', "export { TodayScreen as default } from '@/components/today/TodayScreen';"],
  ['components/shipments/CountScreen.tsx', "export { Button } from '../ui/Button';"],
  ['shared/contracts/shipments.ts', "export { z } from 'zod';"],
  ['shared/domain/assessment/layers.ts', "export { add } from '../money';"],
  ['server/modules/shipments/read-model.ts', "export { sitesById } from '../partners/sites';"],
  ['db/client.ts', "export { drizzle } from 'drizzle-orm/mysql2';"],
];

let refusals: Map<string, string[]>;

beforeAll(() => {
  const cases = [...wrong, ...right];
  const printed = execFileSync(process.execPath, ['tests/architecture/lint-texts.mjs'], {
    input: JSON.stringify(cases),
  });
  const found = JSON.parse(printed.toString()) as string[][];
  refusals = new Map(cases.map((each, index) => [each.join(), found[index] ?? []]));
}, 120_000);

describe('the import table', () => {
  it.each(wrong)('refuses in %s: %s', (file, code) => {
    expect(refusals.get([file, code].join())).not.toEqual([]);
  });

  it.each(right)('lets pass in %s: %s', (file, code) => {
    expect(refusals.get([file, code].join())).toEqual([]);
  });
});
