import type { ReactNode } from 'react';
import { useBreakpoint } from '../theme/use-breakpoint';
import { Box } from '../ui/Box';

/** Whether list and detail stand side by side (LOOK.md: from 1200 px). */
export const useSideBySide = () => useBreakpoint() === 'broad';

/** The list with the record that was chosen from it at its right. */
export function ListAndDetail({ list, detail }: { list: ReactNode; detail: ReactNode }) {
  return (
    <Box row align="start" gap="xl">
      <Box grow least={460}>
        {list}
      </Box>
      <Box grow least={420}>
        {detail}
      </Box>
    </Box>
  );
}
