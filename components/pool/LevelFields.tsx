import { type Control, useFieldArray, useWatch } from 'react-hook-form';
import { text } from '@/shared/text/catalogue';
import { NumberField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card, Rule } from '../ui/Card';
import { Text } from '../ui/Text';
import type { Pool } from './pool-answer';

const words = text.pool.approveForm;

type Level = { siteId: string; minimum: number | null; maximum: number | null };
type Site = Pool['sites'][number];
type Props = { control: unknown; sites: readonly Site[] };

const nameOf = (site: Site) => text.parts.form.site(site.name, site.company);

/** Minimum and maximum of those sites that are given one. */
export function LevelFields({ control: given, sites }: Props) {
  const control = given as Control<{ levels: Level[] }>;
  const { fields, append, remove } = useFieldArray({ control, name: 'levels' });
  const levels = useWatch({ control, name: 'levels' }) ?? [];
  const left = sites.filter((site) => !levels.some((level) => level.siteId === site.id));
  return (
    <Card title={words.levels}>
      <Text variant="soft">{words.levelsHint}</Text>
      {fields.map((field, at) => {
        const site = sites.find((each) => each.id === field.siteId);
        return site === undefined ? null : (
          <Box key={field.id} gap="s">
            <Rule />
            <SiteLevel at={at} site={site} onRemove={() => remove(at)} />
          </Box>
        );
      })}
      {left.map((site) => (
        <Button
          key={site.id}
          kind="secondary"
          label={words.add(nameOf(site))}
          onPress={() => append({ siteId: site.id, minimum: null, maximum: null })}
        />
      ))}
    </Card>
  );
}

function SiteLevel({ at, site, onRemove }: { at: number; site: Site; onRemove: () => void }) {
  return (
    <>
      <Text strong>{nameOf(site)}</Text>
      <Text variant="soft">{words.now(site.units)}</Text>
      <Box row wrap gap="m" align="start">
        <Box grow least={120}>
          <NumberField name={`levels.${at}.minimum`} label={words.minimum} />
        </Box>
        <Box grow least={120}>
          <NumberField name={`levels.${at}.maximum`} label={words.maximum} />
        </Box>
      </Box>
      <Button kind="quiet" label={words.remove(nameOf(site))} onPress={onRemove} />
    </>
  );
}
