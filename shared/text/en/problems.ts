import type { ProblemCode } from '../../problems/problems';
import { plural } from '../plural';
import { formatInstant, formatMonth, formatUnits } from '../format';

type Data = Record<string, unknown>;
export type ClientProblemCode = ProblemCode | 'no connection' | 'answer not understood';

const word = (data: Data, key: string, otherwise: string) =>
  typeof data[key] === 'string' && data[key] !== '' ? (data[key] as string) : otherwise;
const whole = (data: Data, key: string) =>
  typeof data[key] === 'number' ? (data[key] as number) : undefined;

const month = (data: Data, otherwise: string) =>
  typeof data.month === 'string' ? formatMonth(data.month) : otherwise;

/** ", 27 November 2026, 14:10" in the reader's own zone, from the instant that the server gives as `at`. */
function when(data: Data): string {
  const zone = new Intl.DateTimeFormat().resolvedOptions().timeZone;
  return typeof data.at === 'string' ? `, ${formatInstant(data.at, zone)}` : '';
}

function more(data: Data): string {
  const open = whole(data, 'open');
  return open === undefined
    ? 'That is more than is still open here. Nothing was posted.'
    : `That is more than is still open here: ${formatUnits(open)}. Nothing was posted.`;
}

function tooMany(data: Data): string {
  const seconds = whole(data, 'seconds');
  const minutes = seconds === undefined ? undefined : Math.max(1, Math.ceil(seconds / 60));
  return minutes === undefined
    ? 'Too many tries. Wait a few minutes, then try again.'
    : `Too many tries. Try again in ${minutes} ${plural(minutes, { one: 'minute', other: 'minutes' })}.`;
}

/** Why a sheet that is what its name says could not be read. */
function unreadable(data: Data): string {
  const columns = word(data, 'columns', 'the columns');
  const most = formatUnits(whole(data, 'most') ?? 0);
  const sentences: Record<string, string> = {
    'columns missing': `The first line does not name ${columns}. Nothing was stored; start from the template.`,
    'column twice': `The first line names ${columns} twice. Nothing was stored; leave one of them out.`,
    'no rows': 'There are no rows below the heads. Nothing was stored.',
    'too many rows': `The file has more than ${most} rows. Nothing was stored; send it in parts.`,
    'unpacks too large': 'The file unpacks to far more than a sheet holds, so it was not opened.',
    macros: 'The file holds macros or other files, so it was not opened. Save it as a plain XLSX or CSV.',
    'outside parts': 'The file points to things outside itself, so it was not opened. Save it as CSV.',
  };
  return (
    sentences[word(data, 'why', '')] ??
    'The file cannot be read. Open it in your own program to check it, save it again and send that.'
  );
}

/** What happened, what is safe, what to do: a sentence for every problem, with the server's data filled in. */
export const problems: Record<ClientProblemCode, (data: Data) => string> = {
  'not valid': () => 'Some of this cannot be right. Nothing was stored; see the marked fields.',
  'key missing': () =>
    'This was sent without its number. Nothing was stored; reload the page and send it again.',
  'not signed in': () => 'You are signed out. Sign in again; what you typed is kept.',
  'sign-in refused': () => 'E-mail and password do not fit together. Check both, or choose a new password.',
  'link not valid': () => 'This link has been used or is too old. Ask for a new one.',
  'not allowed': () => 'Your role does not allow this. Nothing was changed.',
  'request not trusted': () => 'This page is older than your sign-in. Reload it and send again.',
  'not found': () => 'There is nothing here under this address, or it is not yours to see.',
  'already exists': (data) =>
    `${word(data, 'what', 'This')} exists already. Choose another, or open the one there is.`,
  'already counted': (data) => {
    const by = word(data, 'by', 'Someone');
    return `${by} has counted this already${when(data)}. Your count was not posted.`;
  },
  'already settled': (data) =>
    `${word(data, 'by', 'Someone')} has settled this already. Nothing was posted twice.`,
  'already answered': (data) =>
    `${word(data, 'by', 'Someone')} has answered this already. Your answer was not posted.`,
  'objection over': () =>
    'The days to object to this statement are over, so its lines stand. You can still dispute the count behind them, on its shipment.',
  'already closed': () => 'This month is closed already. Nothing was changed.',
  'already issued': () => 'This statement went out already. Nothing was sent twice.',
  'month closed': () =>
    'This month is closed. Date it in an open month; what was wrong in a closed one is settled as a correction.',
  'month not closed': () => 'This month is still open. Close it first.',
  'month not over': () => 'This month is not over yet. Close it after its last day.',
  'earlier month open': (data) =>
    `${month(data, 'An earlier month')} is still open. Close it first: months close in their order.`,
  'earlier statement waits': (data) =>
    `The statement of ${month(data, 'an earlier month')} has not gone out yet. Issue it first: this one builds on it.`,
  'dispute open': () =>
    'A dispute of this statement is not decided yet. Confirm when it is, or withdraw the dispute.',
  'state changed': () =>
    'Someone changed this while you were at it. Nothing was stored; reload to see how it stands now.',
  'more than open': more,
  'not enough units': () => 'There are not that many units there. Nothing was posted.',
  'cannot be reckoned': (data) =>
    word(data, 'why', 'This cannot be reckoned from what is recorded. Nothing was stored.'),
  'too large': () => 'The file is too large. Nothing was stored; send a smaller one, up to 10 MB.',
  'file not as named': (data) =>
    data.wanted === 'sheet'
      ? 'The file is not what its name says. Nothing was stored; send the template filled in, as CSV or XLSX.'
      : 'The file is not what its name says. Send a photo (JPEG, PNG, WebP) or a PDF.',
  'file not readable': unreadable,
  'content not understood': () => 'The server does not know this kind of content. Nothing was stored.',
  'key used otherwise': () =>
    'This was sent before with other content. What was stored first stands; reload to see it.',
  'too many tries': tooMany,
  'failed here': () => 'Something failed on our side. Nothing was stored unless it shows; try again.',
  'database away': () => 'The book cannot be reached just now. Nothing is lost; try again in a moment.',
  'no connection': () =>
    'No connection. Nothing was sent; what you typed is kept. Try again when the network is back.',
  'answer not understood': () =>
    'The answer could not be read. Reload the page before you send anything again.',
};
