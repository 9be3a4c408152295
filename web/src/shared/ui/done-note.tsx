import { useFocusWhenLost } from '../hooks/use-focus-when-lost';
import './done-note.css';

/** Says what was done, once it was; takes the focus when the button that was pressed is gone. */
export function DoneNote({ words }: { words: string }) {
  const note = useFocusWhenLost<HTMLParagraphElement>(words);
  return (
    <p role="status" tabIndex={-1} ref={note} className="done-note">
      {words}
    </p>
  );
}
