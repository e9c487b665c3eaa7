import { useEffect, useState } from 'react';
import { text } from '@/shared/text/catalogue';
import { formatBytes } from '@/shared/text/format';
import { FieldGroup, type FieldProps } from './Field';

/** What the server takes as evidence; it looks at the content again. */
const evidence = ['image/jpeg', 'image/png', 'image/webp', 'application/pdf'];
/** 10 MB each (PRODUCT: upload limit). */
const largest = 10_000_000;

type Props = FieldProps & {
  value: readonly File[];
  onChange: (files: File[]) => void;
  kind?: 'photo' | 'paper' | 'sheet';
  most?: number;
  /** Types taken, when not photos and PDFs. */
  accept?: readonly string[];
};

/** Photos and papers to send along: a dashed tile, then each file with its picture, name and size. */
export function FileInput({ value, onChange, kind = 'photo', most = 5, accept, ...field }: Props) {
  const [refused, setRefused] = useState<string>();
  const taken = accept ?? evidence;
  const add = (picked: File[]) => {
    const tooLarge = picked.find((file) => file.size > largest);
    const notTaken = picked.find((file) => !accept && file.type !== '' && !taken.includes(file.type));
    const fine = picked.filter(
      (file) => file.size <= largest && (accept || file.type === '' || taken.includes(file.type)),
    );
    const all = [...value, ...fine];
    setRefused(
      tooLarge
        ? text.ui.fileTooLarge(tooLarge.name, formatBytes(largest))
        : notTaken
          ? text.ui.fileNotTaken(notTaken.name)
          : all.length > most
            ? text.ui.filesMost(most)
            : undefined,
    );
    onChange(all.slice(0, most));
  };
  return (
    <FieldGroup {...field} error={field.error ?? refused}>
      <div className="tk-files">
        {value.map((file, at) => (
          <PickedFile
            key={`${file.name}-${at}`}
            file={file}
            onRemove={() => onChange(value.filter((each) => each !== file))}
          />
        ))}
        {value.length < most ? (
          <label className="tk-file-add">
            {kind === 'photo' ? text.ui.addPhoto : text.ui.addPaper}
            <input
              type="file"
              aria-label={`${kind === 'photo' ? text.ui.addPhoto : text.ui.addPaper}: ${field.label}`}
              accept={taken.join(',')}
              multiple={most > 1}
              onChange={(event) => {
                add([...(event.target.files ?? [])]);
                event.target.value = '';
              }}
            />
          </label>
        ) : null}
      </div>
    </FieldGroup>
  );
}

function PickedFile({ file, onRemove }: { file: File; onRemove: () => void }) {
  const [picture, setPicture] = useState<string>();
  useEffect(() => {
    if (!file.type.startsWith('image/')) return undefined;
    const url = URL.createObjectURL(file);
    setPicture(url);
    return () => URL.revokeObjectURL(url);
  }, [file]);
  return (
    <div className="tk-file">
      {picture ? (
        <img className="tk-file-face" src={picture} alt="" />
      ) : (
        <div className="tk-file-face" aria-hidden>
          {file.name.split('.').pop()?.toUpperCase()}
        </div>
      )}
      <button
        type="button"
        className="tk-file-remove"
        aria-label={text.ui.removeFile(file.name)}
        onClick={onRemove}
      >
        <span aria-hidden>×</span>
      </button>
      <span className="tk-file-name">
        {file.name}, {formatBytes(file.size)}
      </span>
    </div>
  );
}
