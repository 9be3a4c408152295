import { Button } from 'antd';
import type { Register } from '../api/use-register';

/** The next page of the list, added to what is shown. */
export function MoreCorrelations({ register }: { register: Register }) {
  const { items = [], total, hasMore, fetchingMore, showMore } = register;
  if (!hasMore) return null;
  return (
    <div className="register-more">
      <Button onClick={showMore} loading={fetchingMore}>
        Show more correlations
      </Button>
      <span>
        {items.length} of {total} shown
      </span>
    </div>
  );
}
