import { confirmImport, type ImportDetail } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost } from '../data/use-operation';
import { Button } from '../ui/Button';
import { Notice } from '../ui/Notice';

const words = text.imports.broken;

/** A posting that gave up: what it did stands, and it can go on. */
export function BrokenBody({ held }: { held: ImportDetail }) {
  const confirm = usePost(confirmImport);
  return (
    <>
      <Notice kind="error" title={words.head}>
        {words.body}
      </Notice>
      {confirm.error ? <Problem error={confirm.error} /> : null}
      <Button
        label={words.goOn}
        busy={confirm.isPending}
        onPress={() => confirm.mutate({ params: { import: held.id }, body: { leaveOut: held.rowsBad } })}
      />
    </>
  );
}
