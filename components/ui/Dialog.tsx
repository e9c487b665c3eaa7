import { useEffect, useId, useRef, type ReactNode } from 'react';
import { text } from '@/shared/text/catalogue';
import { Box } from './Box';
import { Button } from './Button';
import { Text } from './Text';

type Props = {
  open: boolean;
  title: string;
  children: ReactNode;
  onClose: () => void;
  /** False where only an answer inside can close it. */
  canClose?: boolean;
};

/** A native dialog: keeps the focus inside, closes with Escape, and gives the focus back to where it was. */
export function Dialog({ open, title, children, onClose, canClose = true }: Props) {
  const element = useRef<HTMLDialogElement>(null);
  const head = useId();

  useEffect(() => {
    const dialog = element.current;
    if (!dialog || !open) return undefined;
    const before = document.activeElement;
    if (!dialog.open) dialog.showModal();
    return () => {
      dialog.close();
      if (before instanceof HTMLElement) before.focus();
    };
  }, [open]);

  if (!open) return null;
  return (
    <dialog
      ref={element}
      className="tk-dialog"
      aria-labelledby={head}
      onCancel={(event) => {
        event.preventDefault();
        if (canClose) onClose();
      }}
    >
      <Box gap="l">
        <Box row spread="between">
          <Text variant="title" id={head}>
            {title}
          </Text>
          {canClose ? <Button kind="quiet" label={text.ui.close} onPress={onClose} /> : null}
        </Box>
        {children}
      </Box>
    </dialog>
  );
}
