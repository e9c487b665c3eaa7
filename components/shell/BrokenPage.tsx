import { text } from '@/shared/text/catalogue';
import { Button } from '../ui/Button';
import { Page } from '../ui/Page';
import { Notice } from '../ui/Notice';

/** Stands in for a screen that failed while drawing. */
export function BrokenPage({ onReload }: { onReload: () => void }) {
  return (
    <Page title={text.shell.brokenHead} narrow>
      <Notice kind="error">{text.shell.brokenBody}</Notice>
      <Button label={text.shell.reload} onPress={onReload} />
    </Page>
  );
}
