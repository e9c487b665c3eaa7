import { text } from '@/shared/text/catalogue';

type Props = {
  name: string;
  /** Where the browser fetches it; pictures are shown from there too. */
  href: string;
  isPicture: boolean;
  onRemove?: () => void;
};

/** A file that is with the server already: its picture, its name as the link to it, and a way to take it off. */
export function StoredFile({ name, href, isPicture, onRemove }: Props) {
  return (
    <div className="tk-file">
      {isPicture ? (
        <img className="tk-file-face" src={href} alt="" />
      ) : (
        <div className="tk-file-face" aria-hidden>
          {name.split('.').pop()?.toUpperCase()}
        </div>
      )}
      {onRemove ? (
        <button
          type="button"
          className="tk-file-remove"
          aria-label={text.ui.removeFile(name)}
          onClick={onRemove}
        >
          <span aria-hidden>×</span>
        </button>
      ) : null}
      <a className="tk-file-name" href={href} download={name}>
        {name}
      </a>
    </div>
  );
}

export function StoredFiles({ children }: { children: React.ReactNode }) {
  return <div className="tk-files">{children}</div>;
}

type ListProps = {
  files: readonly { id: string; name: string; mediaType: string }[];
  hrefOf: (id: string) => string;
};

/** What hangs on a count or a word of a thread; nothing where there are no files. */
export function StoredFileList({ files, hrefOf }: ListProps) {
  if (files.length === 0) return null;
  return (
    <StoredFiles>
      {files.map(({ id, name, mediaType }) => (
        <StoredFile key={id} name={name} href={hrefOf(id)} isPicture={mediaType.startsWith('image/')} />
      ))}
    </StoredFiles>
  );
}
