import type { Settings } from '../../../shared/api/types';
import './settings.css';

/** The settings as they are, for who may not change them. */
export function SettingsList({ settings }: { settings: Settings }) {
  const { officeName, reviewsNeeded, principal, reviewDueMonths } = settings;
  return (
    <dl className="settings-list">
      <dt>Name of the office</dt>
      <dd>{officeName}</dd>
      <dt>Favourable reviews before an approval</dt>
      <dd>{reviewsNeeded}</dd>
      <dt>Principal of the office</dt>
      <dd>{principal?.name ?? 'nobody'}</dd>
      <dt>An approved revision is due for review after</dt>
      <dd>
        {reviewDueMonths} {reviewDueMonths === 1 ? 'month' : 'months'}
      </dd>
    </dl>
  );
}
