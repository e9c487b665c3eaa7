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

type Picked = {
  files: readonly File[];
  before: readonly File[];
  most: number;
  accept: readonly string[] | undefined;
};

/** What can be taken of the picked files, and the reason for what cannot. */
function sortPicked({ files, before, most, accept }: Picked): { all: File[]; reason: string | undefined } {
  const fits = (file: File) => file.size <= largest;
  const known = (file: File) => accept !== undefined || file.type === '' || evidence.includes(file.type);
  const tooLarge = files.find((file) => !fits(file));
  const unknown = files.find((file) => !known(file));
  const all = [...before, ...files.filter((file) => fits(file) && known(file))];
  const reason = tooLarge
    ? text.ui.fileTooLarge(tooLarge.name, formatBytes(largest))
    : unknown
      ? text.ui.fileNotTaken(unknown.name)
      : all.length > most
        ? text.ui.filesMost(most)
        : undefined;
  return { all: all.slice(0, most), reason };
}

/** Photos and papers to send along: a dashed tile, then each file with its picture, name and size. */
export function FileInput({ value, onChange, kind = 'photo', most = 5, accept, ...field }: Props) {
  const [refused, setRefused] = useState<string>();
  const words = kind === 'photo' ? text.ui.addPhoto : kind === 'paper' ? text.ui.addPaper : text.ui.addFile;
  const add = (picked: File[]) => {
    const { all, reason } = sortPicked({ files: picked, before: value, most, accept });
    setRefused(reason);
    onChange(all);
  };
  const remove = (file: File) => onChange(value.filter((each) => each !== file));
  return (
    <FieldGroup {...field} error={field.error ?? refused}>
      <div className="tk-files">
        {value.map((file, at) => (
          <PickedFile key={`${file.name}-${at}`} file={file} onRemove={() => remove(file)} />
        ))}
        {value.length < most ? (
          <label className="tk-file-add">
            {words}
            <input
              type="file"
              aria-label={`${words}: ${field.label}`}
              accept={(accept ?? evidence).join(',')}
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
