import type { MouseEvent } from 'react';

/** Attributes that React Native for web hands to the page, but that React Native's own types do not name. */
type WebProps = {
  href?: string;
  hrefAttrs?: { target?: string; rel?: string; download?: boolean };
  onClick?: (event: MouseEvent) => void;
  dataSet?: Record<string, string>;
  'aria-current'?: 'page' | undefined;
  'aria-describedby'?: string | undefined;
  'aria-controls'?: string;
  'aria-level'?: number;
  tabIndex?: 0 | -1;
};

export const web = (props: WebProps): object => props;
