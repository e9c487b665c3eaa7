import type { z } from 'zod';
import { fields } from './en/fields';

type Issue = z.core.$ZodRawIssue;

const isMissing = (input: unknown) => input === undefined || input === null || input === '';

function wrongType(issue: Issue): string {
  if (isMissing(issue.input)) return fields.needed;
  if (issue['expected'] === 'int') return fields.wholeNumber;
  return issue['expected'] === 'number' ? fields.wholeNumber : fields.notRight;
}

function tooSmall(issue: Issue): string {
  const least = Number(issue['minimum']);
  if (issue['origin'] === 'string') return least <= 1 ? fields.needed : fields.atLeastCharacters(least);
  if (issue['origin'] === 'array') return fields.atLeastEntries(least);
  return issue['inclusive'] ? fields.notBelow(String(least)) : fields.above(String(least));
}

function tooBig(issue: Issue): string {
  const most = Number(issue['maximum']);
  if (issue['origin'] === 'string') return fields.atMostCharacters(most);
  if (issue['origin'] === 'array') return fields.atMostEntries(most);
  return issue['inclusive'] ? fields.notAbove(String(most)) : fields.below(String(most));
}

function wrongFormat(issue: Issue): string {
  if (isMissing(issue.input)) return fields.needed;
  if (issue['format'] === 'email') return fields.email;
  if (issue['format'] === 'uuid') return fields.choose;
  return issue['format'] === 'date' ? fields.day : fields.notRight;
}

/**
 * The sentence for a field that zod refuses. Handed to a parse as `error`, it yields to a message that the schema
 * states itself.
 */
export function fieldMessage(issue: Issue): string {
  switch (issue.code) {
    case 'invalid_type':
      return wrongType(issue);
    case 'too_small':
      return tooSmall(issue);
    case 'too_big':
      return tooBig(issue);
    case 'invalid_format':
      return wrongFormat(issue);
    case 'invalid_value':
    case 'invalid_union':
      return isMissing(issue.input) ? fields.choose : fields.notRight;
    default:
      return isMissing(issue.input) ? fields.needed : fields.notRight;
  }
}
