import { useEffect } from 'react';
import { useFormContext } from 'react-hook-form';
import { downloadFile, mostFilesOnOne } from '@/shared/contracts/files';
import { text } from '@/shared/text/catalogue';
import { urlOf } from '../data/url-of';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { FileInput } from '../ui/FileInput';
import { Notice } from '../ui/Notice';
import { StoredFile, StoredFiles } from '../ui/StoredFile';
import { Text } from '../ui/Text';
import { useField } from './use-field';
import { type SentFile, useSentFiles } from './use-sent-files';

type Props = {
  name: string;
  label: string;
  hint?: string;
  kind?: 'photo' | 'paper';
  hideLabel?: boolean;
  /** Whether a file is under way or did not arrive: the form is not sent without it. */
  onUnsent: (unsent: boolean) => void;
};

/** Files that are sent as they are picked: what is with the server survives a reload with the rest of the form. */
export function SentFilesField({ name, label, hint, kind = 'paper', hideLabel = false, onUnsent }: Props) {
  const field = useField<SentFile[]>(name, label);
  const kept = field.value ?? [];
  const { getValues } = useFormContext();
  const sending = useSentFiles((file) => field.onChange([...((getValues(name) as SentFile[]) ?? []), file]));
  const unsent = sending.isGoing || sending.failed.length > 0;
  useEffect(() => onUnsent(unsent), [unsent, onUnsent]);
  return (
    <Box gap="s">
      {kept.length > 0 ? (
        <StoredFiles>
          {kept.map((file) => (
            <StoredFile
              key={file.id}
              name={file.name}
              href={urlOf(downloadFile, { params: { file: file.id } })}
              isPicture={file.mediaType.startsWith('image/')}
              onRemove={() => field.onChange(kept.filter((each) => each !== file))}
            />
          ))}
        </StoredFiles>
      ) : null}
      <FileInput
        id={field.id}
        label={label}
        hideLabel={hideLabel}
        {...(hint === undefined ? {} : { hint })}
        error={field.error}
        kind={kind}
        value={sending.files}
        onChange={sending.pick}
        most={Math.max(sending.files.length, mostFilesOnOne - kept.length)}
      />
      <Going sending={sending} />
    </Box>
  );
}

function Going({ sending }: { sending: ReturnType<typeof useSentFiles> }) {
  return (
    <>
      {sending.isGoing ? (
        <Text variant="soft" role="status">
          {text.ui.filesGoing}
        </Text>
      ) : null}
      {sending.failed.length > 0 ? (
        <Notice kind="error">
          {sending.failed.map(({ file, key, problem }) => (
            <Text key={key}>{`${text.ui.fileNotSent(file.name)} ${problem ?? ''}`}</Text>
          ))}
          <Button kind="secondary" label={text.ui.tryAgain} onPress={sending.sendAgain} />
        </Notice>
      ) : null}
    </>
  );
}
