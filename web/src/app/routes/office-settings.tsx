import { SettingsEditor } from '../../features/settings/components/settings-editor';
import { SettingsList } from '../../features/settings/components/settings-list';
import { useSettings } from '../../features/settings/api/use-settings';
import { usePeople } from '../../shared/people/use-people';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { OfficeNav } from '../layout/office-nav';

export function OfficeSettingsRoute() {
  const { may } = useSession();
  const { settings, problem, retry, change } = useSettings();
  const mayChange = may('settings.change');
  return (
    <SheetPage
      title="Settings"
      subtitle="What the office has decided on."
      runningHead={<OfficeNav />}
      margin={
        <MarginNote title="Who may change this">
          Administrators. Each change stands in the journal, with what was before.
        </MarginNote>
      }
    >
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
      {!settings && !problem ? <Loading what="the settings" /> : null}
      {settings && !mayChange ? <SettingsList settings={settings} /> : null}
      {settings && mayChange ? <EditedSettings settings={settings} onChange={change} /> : null}
    </SheetPage>
  );
}

function EditedSettings({
  settings,
  onChange,
}: Pick<Parameters<typeof SettingsEditor>[0], 'settings' | 'onChange'>) {
  const { present, problem, refetch } = usePeople();
  if (problem) return <ProblemNotice problem={problem} onRetry={() => void refetch()} />;
  if (!present) return <Loading what="the people" />;
  const candidates = present.filter(({ roles }) => !roles.includes('administrator'));
  return <SettingsEditor settings={settings} candidates={candidates} onChange={onChange} />;
}
