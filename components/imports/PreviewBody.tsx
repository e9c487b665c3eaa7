import { router } from 'expo-router';
import { useState } from 'react';
import { confirmImport, downloadBadRows, dropImport, type ImportDetail } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { urlOf } from '../data/url-of';
import { usePost } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Checkbox } from '../ui/Checkbox';
import { DownloadLink } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { stateTones } from './import-columns';
import { PreviewRows } from './PreviewRows';
import { PreviewTotals } from './PreviewTotals';

const words = text.imports.preview;
type Props = { held: ImportDetail; back: { href: string; label: string } };

/** What the file says and what is wrong with it, before anything is posted. */
export function PreviewBody({ held, back }: Props) {
  const { company } = useSignedIn();
  const [leavesOut, setLeavesOut] = useState(false);
  const [isUnsaid, setUnsaid] = useState(false);
  const confirm = usePost(confirmImport, { refreshes: ['shipments', 'differences', 'balances'] });
  const drop = usePost(dropImport);
  const post = () => {
    const unsaid = held.rowsBad > 0 && !leavesOut;
    setUnsaid(unsaid);
    if (!unsaid) confirm.mutate({ params: { import: held.id }, body: { leaveOut: held.rowsBad } });
  };
  // Awaited, not `onSuccess`: what is read anew takes this preview away before that is called.
  const putAside = () =>
    drop.mutateAsync({ params: { import: held.id } }).then(
      () => router.replace('/imports'),
      () => undefined,
    );
  const action =
    held.rowsGood > 0 ? (
      <Button label={words.confirm(held.rowsGood)} busy={confirm.isPending} onPress={post} />
    ) : undefined;
  return (
    <Page
      title={held.fileName}
      lead={words.lead(held.by ?? '', formatInstant(held.createdAt, company.timeZone))}
      back={back}
      beside={<Tag tone={stateTones.preview} label={text.imports.states.preview} />}
      {...(action ? { action } : {})}
    >
      {confirm.error ? <Problem error={confirm.error} /> : null}
      {drop.error ? <Problem error={drop.error} /> : null}
      <Verdict held={held} />
      {held.rowsBad > 0 ? (
        <BadRowsCard
          held={held}
          value={leavesOut}
          onChange={(next) => {
            setLeavesOut(next);
            setUnsaid(false);
          }}
          isUnsaid={isUnsaid}
        />
      ) : null}
      <PreviewTotals totals={held.totals} />
      <PreviewRows id={held.id} />
      <Button kind="quiet" label={words.drop} busy={drop.isPending} onPress={putAside} />
    </Page>
  );
}

function Verdict({ held }: { held: ImportDetail }) {
  if (held.rowsGood === 0) return <Notice kind="error">{words.noneGood}</Notice>;
  return held.rowsBad === 0 ? (
    <Notice kind="success">{words.allGood(held.rowsGood)}</Notice>
  ) : (
    <Notice kind="caution">{words.someBad(held.rowsBad, held.rowsGood)}</Notice>
  );
}

type BadProps = {
  held: ImportDetail;
  value: boolean;
  onChange: (value: boolean) => void;
  isUnsaid: boolean;
};

function BadRowsCard({ held, value, onChange, isUnsaid }: BadProps) {
  const href = urlOf(downloadBadRows, { params: { import: held.id } });
  return (
    <Card tone="differs">
      <Text>{words.badHint}</Text>
      {held.rowsGood > 0 ? (
        <Checkbox
          label={words.leaveOut(held.rowsBad)}
          hint={words.leaveOutHint}
          value={value}
          onChange={onChange}
          {...(isUnsaid ? { error: words.sayFirst(held.rowsBad) } : {})}
        />
      ) : null}
      <Box row wrap>
        <DownloadLink href={href} label={words.badFile} />
      </Box>
    </Card>
  );
}
