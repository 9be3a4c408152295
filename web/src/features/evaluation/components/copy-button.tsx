import { Button } from 'antd';
import { useState } from 'react';

interface CopyButtonProps {
  text: () => string;
  children: string;
  /** A link-like button, beside a number. */
  quiet?: boolean;
}

/** Puts text on the clipboard and says whether that worked. */
export function CopyButton({ text, children, quiet = false }: CopyButtonProps) {
  const [said, setSaid] = useState('');
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text());
      setSaid('Copied.');
    } catch {
      setSaid('The browser did not allow copying.');
    }
  };
  return (
    <span className="copy">
      <Button size={quiet ? 'small' : 'middle'} type={quiet ? 'link' : 'default'} onClick={() => void copy()}>
        {children}
      </Button>
      <span role="status" className="copy-said">
        {said}
      </span>
    </span>
  );
}
