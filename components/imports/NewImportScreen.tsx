import { router } from 'expo-router';
import { useState } from 'react';
import { importTemplate, uploadImport } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { urlOf } from '../data/url-of';
import { usePost } from '../data/use-operation';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { FileInput } from '../ui/FileInput';
import { DownloadLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Text } from '../ui/Text';

const words = text.imports.start;
/** Endings and types, since systems disagree about the type of a CSV. */
const accept = [
  '.csv',
  '.xlsx',
  'text/csv',
  'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
];

export function NewImportScreen() {
  const [files, setFiles] = useState<File[]>([]);
  const [isMissing, setMissing] = useState(false);
  const upload = usePost(uploadImport);
  const read = () => {
    setMissing(files.length === 0);
    if (files.length === 0) return;
    upload.mutate({ files: { file: files } }, { onSuccess: ({ id }) => router.replace(`/imports/${id}`) });
  };
  const begin = (
    <Button
      label={upload.isPending ? words.reading : words.read}
      disabled={upload.isPending}
      onPress={read}
    />
  );
  return (
    <Page
      title={words.head}
      lead={words.lead}
      back={{ href: '/imports', label: text.imports.list.head }}
      action={begin}
      narrow
    >
      {upload.error ? <Problem error={upload.error} /> : null}
      <Card>
        <FileInput
          label={words.file}
          kind="sheet"
          most={1}
          accept={accept}
          value={files}
          onChange={(picked) => {
            setFiles(picked);
            setMissing(false);
            upload.reset();
          }}
          {...(isMissing ? { error: words.fileMissing } : {})}
        />
      </Card>
      <Card title={words.templateHead}>
        <Box row wrap gap="m">
          <DownloadLink href={urlOf(importTemplate, { query: { as: 'csv' } })} label={words.templateCsv} />
          <DownloadLink href={urlOf(importTemplate, { query: { as: 'xlsx' } })} label={words.templateXlsx} />
        </Box>
        <Box gap="xs">
          {text.imports.template.helpLines.map((line) => (
            <Text key={line} variant="soft">
              {line}
            </Text>
          ))}
        </Box>
      </Card>
      <Card title={words.whatHappens}>
        {words.steps.map((step, at) => (
          <Text key={step}>{`${at + 1}. ${step}`}</Text>
        ))}
      </Card>
    </Page>
  );
}
