import type { ContentLine } from '@/shared/domain/statement/content';
import { text } from '@/shared/text/catalogue';
import { formatAmount } from '@/shared/text/format';
import { workedOut } from '@/shared/text/statement-words';
import { Box } from '../ui/Box';
import { Disclosure } from '../ui/Disclosure';
import { Link } from '../ui/Link';
import { Text } from '../ui/Text';
import { DisputeTags } from './DisputeTags';
import type { LineGroup } from './line-groups';
import { movementsHref } from './movements-href';
import type { StatementPage } from './StatementScreen';

const words = text.statements.page;
type Props = { page: StatementPage; groups: readonly LineGroup[] };

/** The rule of each row in a sentence, and each line written out with its own figures. */
export function HowReckoned({ page, groups }: Props) {
  return (
    <Disclosure label={words.worked}>
      <Box gap="l" pad="s">
        {groups.map((group) => (
          <Group key={group.key} page={page} group={group} />
        ))}
      </Box>
    </Disclosure>
  );
}

function Group({ page, group }: { page: StatementPage; group: LineGroup }) {
  const [first] = group.lines;
  if (!first) return null;
  const rule = first.correction
    ? text.statements.worked.correction
    : text.statements.worked.rules[first.component];
  return (
    <Box gap="xs">
      <Text variant="label">{group.title}</Text>
      <Text variant="small">{rule}</Text>
      {group.lines.map((line) => (
        <WorkedLine key={line.id} page={page} line={line} title={group.title} />
      ))}
    </Box>
  );
}

function WorkedLine({ page, line, title }: { page: StatementPage; line: ContentLine; title: string }) {
  const name = page.content.types.find((type) => type.code === line.typeCode)?.name ?? line.typeCode ?? '';
  const sum = line.credit
    ? `${line.credit.reason}: ${formatAmount(line.amount, page.currency)}`
    : workedOut(line, page.content);
  return (
    <Box row wrap gap="l">
      <Text>{name === '' ? sum : `${name}: ${sum}`}</Text>
      <DisputeTags page={page} lines={[line]} />
      <Box row gap="l">
        {line.credit ? null : (
          <Link
            href={movementsHref(page.id, { line: line.id })}
            label={text.statements.movements.head}
            name={words.movementsOf(`${title}, ${name}`)}
            size="small"
          />
        )}
        {page.mayDispute ? (
          <Link
            href={`/statements/${page.id}/dispute?line=${line.id}`}
            label={words.dispute}
            name={words.disputeLine(`${title}, ${name}`)}
            size="small"
          />
        ) : null}
      </Box>
    </Box>
  );
}
