import { useFormContext, useWatch } from 'react-hook-form';
import { downloadFile, mostFilesOnOne } from '@/shared/contracts/files';
import { text } from '@/shared/text/catalogue';
import { urlOf } from '../data/url-of';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { FileInput } from '../ui/FileInput';
import { Notice } from '../ui/Notice';
import { StoredFile, StoredFiles } from '../ui/StoredFile';
import { Text } from '../ui/Text';
import type { KeptPhoto, usePhotos } from './use-photos';

const words = text.shipments;

type Props = { photos: ReturnType<typeof usePhotos> };

/** Photos of the load: those that are with the server already survive a reload with the rest of the form. */
export function PhotosField({ photos }: Props) {
  const { setValue } = useFormContext();
  const kept = (useWatch({ name: 'photos' }) ?? []) as KeptPhoto[];
  const takeOff = (id: string) =>
    setValue(
      'photos',
      kept.filter((photo) => photo.id !== id),
      { shouldDirty: true },
    );
  return (
    <Box gap="s">
      {kept.length > 0 ? (
        <StoredFiles>
          {kept.map(({ id, name, mediaType }) => (
            <StoredFile
              key={id}
              name={name}
              href={urlOf(downloadFile, { params: { file: id } })}
              isPicture={mediaType.startsWith('image/')}
              onRemove={() => takeOff(id)}
            />
          ))}
        </StoredFiles>
      ) : null}
      <FileInput
        label={words.photos}
        hideLabel
        hint={words.photosHint}
        value={photos.files}
        onChange={photos.pick}
        most={Math.max(photos.files.length, mostFilesOnOne - kept.length)}
      />
      {photos.isGoing ? (
        <Text variant="soft" role="status">
          {words.photosGoing}
        </Text>
      ) : null}
      {photos.failed.length > 0 ? (
        <Notice kind="error">
          {photos.failed.map(({ file, key, problem }) => (
            <Text key={key}>{`${words.photoNotSent(file.name)} ${problem ?? ''}`}</Text>
          ))}
          <Button kind="secondary" label={text.ui.tryAgain} onPress={photos.sendAgain} />
        </Notice>
      ) : null}
    </Box>
  );
}
