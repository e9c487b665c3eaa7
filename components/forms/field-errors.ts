import type { FieldErrors } from 'react-hook-form';

export type ListedError = { path: string; message: string };

/** The id of the input of a path, so that the summary can lead to it. */
export const fieldId = (form: string, path: string) => `${form}-${path}`.replace(/[^A-Za-z0-9_-]+/g, '-');

/** All errors of a form, in the order of its values, with the path of each: "lines.0.counted". */
export function listErrors(errors: FieldErrors, before = ''): ListedError[] {
  return Object.entries(errors).flatMap(([key, error]) => {
    if (error === undefined || error === null || typeof error !== 'object' || key === 'ref') return [];
    const path = before === '' ? key : `${before}.${key}`;
    const message = (error as { message?: unknown }).message;
    if (typeof message === 'string' && message !== '')
      return [{ path: path.replace(/\.root$/, ''), message }];
    return listErrors(error as FieldErrors, path);
  });
}
