import { Button } from 'antd';

/** The content changed while the page was open: nothing was done, and nothing typed is lost by looking again. */
export function StaleNotice({ onReload }: { onReload: () => void }) {
  return (
    <div className="notice notice-problem" role="alert">
      <p className="notice-title">The sheet has changed since you opened this page</p>
      <p>
        Nothing was recorded, since it would have been about content that you have not seen. Load the present
        content, look at what differs, and do it again. What you have written stays.
      </p>
      <Button onClick={onReload}>Load the present content</Button>
    </div>
  );
}
