import { plural } from '../plural';

/** What stands at a field that cannot be taken. */
export const fields = {
  needed: 'This is needed.',
  choose: 'Choose one.',
  wholeNumber: 'Write a whole number, like 392.',
  amount: 'Write an amount, like 4.50.',
  number: 'Write a number.',
  email: 'Write an e-mail address, like ane@example.com.',
  day: 'Choose a day.',
  atLeastCharacters: (least: number) =>
    `At least ${least} ${plural(least, { one: 'character', other: 'characters' })}.`,
  atMostCharacters: (most: number) =>
    `At most ${most} ${plural(most, { one: 'character', other: 'characters' })}.`,
  notBelow: (least: string) => `Not below ${least}.`,
  above: (least: string) => `More than ${least}.`,
  notAbove: (most: string) => `Not above ${most}.`,
  below: (most: string) => `Less than ${most}.`,
  atLeastEntries: (least: number) => `At least ${least} ${plural(least, { one: 'line', other: 'lines' })}.`,
  atMostEntries: (most: number) => `At most ${most} ${plural(most, { one: 'line', other: 'lines' })}.`,
  notRight: 'This cannot be right.',
} as const;
