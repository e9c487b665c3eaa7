import type { ReactNode } from 'react';

/** A real form, so that Enter sends it and password managers know it; checking is the form kit's. */
export function FormElement({
  name,
  onSubmit,
  children,
}: {
  name: string;
  onSubmit: () => void;
  children: ReactNode;
}) {
  return (
    <form
      noValidate
      aria-label={name}
      style={{ display: 'flex', flexDirection: 'column', gap: 16 }}
      onSubmit={(event) => {
        event.preventDefault();
        onSubmit();
      }}
    >
      {children}
      <input type="submit" hidden tabIndex={-1} />
    </form>
  );
}
