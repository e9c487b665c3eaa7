import { useState } from 'react';
import { addSite } from '@/shared/contracts/partners';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Sheet } from '../ui/Sheet';
import type { Partner } from './PartnerScreen';

const words = text.partners;
type Site = Partner['sites'][number];

const columns = [
  { key: 'code', head: words.sites.columns.code, cell: (site: Site) => site.code, names: true },
  { key: 'name', head: words.sites.columns.name, cell: (site: Site) => site.name },
  {
    key: 'gln',
    head: words.sites.columns.gln,
    cell: (site: Site) => site.gln ?? words.sites.none,
    soft: true,
  },
  { key: 'zone', head: words.sites.columns.zone, cell: (site: Site) => site.timeZone, soft: true },
  {
    key: 'state',
    head: words.sites.columns.state,
    cell: (site: Site) => (site.active ? words.states.active : words.states.inactive),
  },
];

/** The sites of a company, and a form for one more. */
export function SitesCard({ partner, mayAdd }: { partner: Partner; mayAdd: boolean }) {
  const [adding, setAdding] = useState(false);
  return (
    <Card
      title={words.sites.title}
      beside={
        mayAdd && !adding ? (
          <Button kind="quiet" label={words.sites.add} onPress={() => setAdding(true)} />
        ) : undefined
      }
    >
      <Sheet
        caption={words.sites.title}
        hideCaption
        columns={columns}
        rows={partner.sites}
        rowKey={(site) => site.id}
        stack
      />
      {adding ? <NewSite partner={partner} onDone={() => setAdding(false)} /> : null}
    </Card>
  );
}

function NewSite({ partner, onDone }: { partner: Partner; onDone: () => void }) {
  const draft = useDraftForm({
    name: `new site of ${partner.id}`,
    schema: addSite.body!,
    defaultValues: {
      code: '',
      name: '',
      gln: '',
      timeZone: partner.sites[0]?.timeZone ?? 'Europe/Copenhagen',
    },
  });
  const post = usePost(addSite);
  return (
    <FormFrame
      draft={draft}
      label={words.sites.add}
      submitLabel={words.sites.add}
      onSubmit={async (body) => {
        await post.mutateAsync({ params: { partner: partner.id }, body });
        announce(words.sites.added);
        onDone();
      }}
    >
      <TextField name="name" label={words.fields.name} />
      <TextField name="code" label={words.fields.code} hint={words.fields.codeHint} />
      <TextField name="gln" label={words.fields.gln} hint={words.fields.glnHint} optional />
      <TextField name="timeZone" label={words.fields.timeZone} />
    </FormFrame>
  );
}
