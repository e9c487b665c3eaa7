import { Fragment, type ReactNode } from 'react';
import type { Tone } from '../theme/meaning';
import { Box } from '../ui/Box';
import { Card, Rule } from '../ui/Card';
import { ButtonLink, Link } from '../ui/Link';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { text } from '@/shared/text/catalogue';

export type WorkRow = {
  key: string;
  title?: string;
  /** After the title, softer. */
  beside?: string;
  tag?: { tone: Tone; label: string };
  lines: readonly string[];
  /** The one next action; `name` says of what, for screen readers. */
  action: { href: string; label: string; name: string; button?: 'primary' | 'secondary' };
};

type Props = {
  title?: string;
  tag?: { tone: Tone; label: string };
  rows: readonly WorkRow[];
  /** How many there are in all, and where. */
  all?: { total: number; href: string };
  children?: ReactNode;
};

/** A piece of the worklist: what waits, each with its one next action. */
export function WorkCard({ title, tag, rows, all, children }: Props) {
  const more = all !== undefined && all.total > rows.length;
  return (
    <Card
      {...(title === undefined ? {} : { title })}
      beside={
        more ? <Link href={all.href} label={text.today.all(all.total)} /> : tag ? <Tag {...tag} /> : undefined
      }
    >
      {rows.map((row, at) => (
        <Fragment key={row.key}>
          {at > 0 || title !== undefined ? <Rule /> : null}
          <OneRow row={row} />
        </Fragment>
      ))}
      {children}
    </Card>
  );
}

function OneRow({ row }: { row: WorkRow }) {
  const { href, label, name, button } = row.action;
  return (
    <Box row spread="between" gap="m">
      <Box gap="xs" grow>
        {row.tag ? <Tag {...row.tag} /> : null}
        {row.title === undefined ? null : (
          <Box row wrap gap="s" align="baseline">
            <Text variant="large" strong>
              {row.title}
            </Text>
            {row.beside === undefined ? null : <Text variant="soft">{row.beside}</Text>}
          </Box>
        )}
        {row.lines.map((line) => (
          <Text key={line} variant="soft">
            {line}
          </Text>
        ))}
      </Box>
      {button ? (
        <ButtonLink kind={button} href={href} label={label} name={name} />
      ) : (
        <Link href={href} label={label} name={name} />
      )}
    </Box>
  );
}
