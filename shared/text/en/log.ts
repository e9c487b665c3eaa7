import { plural } from '../plural';

export const log = {
  title: 'Log',
  lead: 'Who did what, newest first. Nobody can change it.',
  search: 'Action or request number',
  empty: {
    title: 'Nothing is written here yet',
    hint: 'Every sign-in, posting, refusal and change leaves a line.',
  },
  columns: {
    at: 'When (UTC)',
    person: 'Who',
    company: 'Company',
    action: 'What',
    outcome: 'Outcome',
    subject: 'On what',
    request: 'Request',
  },
  nobody: 'nobody signed in',
  /** "settleDifference" as a person reads it: "settle difference". */
  action: (name: string) => name.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase(),
  outcomes: { all: 'Any outcome', done: 'done', refused: 'refused' },
  outcomeFilter: 'Outcome',
  subjectFilter: 'On what',
  subjects: { book: 'Checks of the book' },
  seals: {
    title: 'The seals of the ledger',
    check: 'Check the seals',
    fit: (entries: number) =>
      `${plural(entries, { one: '1 sealed entry fits', other: `All ${entries} sealed entries fit` })} its chain. Nothing was changed behind the book’s back.`,
    broken: (entry: number) =>
      `Entry ${entry} does not fit its seal: somebody changed it behind the book’s back. Restore it from a copy, and find out who has the database’s keys.`,
    none: 'Nothing is sealed yet. Entries are sealed each hour.',
  },
};

export const letters = {
  title: 'Mail',
  lead: 'What the book has written to people. Without a mail server, messages are captured here instead of sent.',
  search: 'Address or subject',
  empty: {
    title: 'No message yet',
    hint: 'Invitations, deliveries to count and statements are written here first.',
  },
  columns: { at: 'Written (UTC)', to: 'To', subject: 'Subject', state: 'State' },
  states: { waiting: 'waiting', sent: 'sent', captured: 'captured', failed: 'not sent' },
  stateFilter: 'State',
  anyState: 'Any state',
  to: (name: string, address: string) => `To ${name}, ${address}`,
  gone: 'The text carried a link that opens an account, so it is not kept after sending.',
  problem: 'What the mail server said',
};
