import { createContext, useContext, useEffect } from 'react';

type FormPlace = { name: string; nameField: (path: string, label: string) => void };

/** What a field needs to know of its form: its name for ids, and where to leave its label for the summary. */
export const FormPlaceContext = createContext<FormPlace>({ name: 'form', nameField: () => undefined });

export function useFormPlace(path: string, label: string): string {
  const { name, nameField } = useContext(FormPlaceContext);
  useEffect(() => nameField(path, label), [nameField, path, label]);
  return name;
}
