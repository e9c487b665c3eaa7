import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Text } from '../ui/Text';
import type { Pages } from './RecordList';

/** Under a list: how many rows are shown, and the way to more. */
export function PageEnd({ list, shown }: { list: Pages; shown: number }) {
  return (
    <Box row wrap spread="between">
      <Text variant="small" role="status">
        {list.hasNextPage ? text.ui.shown(shown) : text.ui.allShown(shown)}
      </Text>
      {list.hasNextPage ? (
        <Button
          kind="secondary"
          label={text.ui.showMore}
          busy={list.isFetchingNextPage ?? false}
          onPress={() => void list.fetchNextPage?.()}
        />
      ) : null}
    </Box>
  );
}
