import type { ReactNode } from 'react';
import { Box } from './Box';
import { Text } from './Text';

/** What will stand here and how to begin. */
export function EmptyState({ title, hint, action }: { title: string; hint?: string; action?: ReactNode }) {
  return (
    <Box gap="s" pad="l" align="start">
      <Text variant="subhead" level={3}>
        {title}
      </Text>
      {hint === undefined ? null : <Text variant="soft">{hint}</Text>}
      {action}
    </Box>
  );
}
