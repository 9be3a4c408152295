import { Button } from 'antd';
import { useEffect, useId, useRef, type ReactNode } from 'react';
import './act-dialog.css';

interface ActDialogProps {
  /** What is about to happen, with its object: `Withdraw revision 2`. */
  title: string;
  /** The verb with its object on the button that does it. */
  act: string;
  /** On the button that leaves everything as it is. */
  leave?: string;
  working?: boolean;
  onAct: () => void;
  onLeave: () => void;
  children: ReactNode;
}

/**
 * Asks before an act, naming what happens. The browser's own dialog keeps the focus inside, closes on Escape and
 * gives the focus back to where it was.
 */
export function ActDialog({
  title,
  act,
  leave = 'Leave it as it is',
  working = false,
  onAct,
  onLeave,
  children,
}: ActDialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const heading = useId();
  useEffect(() => {
    const node = dialog.current;
    if (node && !node.open) node.showModal();
    return () => node?.close();
  }, []);
  return (
    <dialog
      ref={dialog}
      className="act-dialog"
      aria-labelledby={heading}
      onCancel={(event) => {
        // A file picker inside that is closed without a choice cancels as well; the dialog stays.
        if (event.target !== event.currentTarget) return;
        event.preventDefault();
        onLeave();
      }}
    >
      <h2 className="act-dialog-title" id={heading}>
        {title}
      </h2>
      <form
        className="act-dialog-body"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          onAct();
        }}
      >
        {children}
        <p className="act-dialog-acts">
          <Button type="primary" htmlType="submit" loading={working}>
            {act}
          </Button>
          <Button onClick={onLeave}>{leave}</Button>
        </p>
      </form>
    </dialog>
  );
}
