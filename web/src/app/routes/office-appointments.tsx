import { useAppointments } from '../../features/appointments/api/use-appointments';
import { AppointmentsView } from '../../features/appointments/components/appointments-view';
import { useGeometries } from '../../features/geometries/api/use-geometries';
import { useSettings } from '../../features/settings/api/use-settings';
import { usePeople } from '../../shared/people/use-people';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { OfficeNav } from '../layout/office-nav';

export function OfficeAppointmentsRoute() {
  const { may } = useSession();
  const { appointments, problem, refetch } = useAppointments();
  const { geometries } = useGeometries();
  const candidates = useCandidates();
  return (
    <SheetPage
      title="Appointments"
      subtitle="Who decides what may be used for design: for which geometries, and until when."
      runningHead={<OfficeNav />}
      margin={<AppointmentNotes />}
    >
      {problem ? <ProblemNotice problem={problem} onRetry={() => void refetch()} /> : null}
      {!appointments && !problem ? <Loading what="the appointments" /> : null}
      {appointments ? (
        <AppointmentsView
          appointments={appointments}
          geometries={geometries}
          candidates={may('appointment.propose') ? candidates : null}
          refetch={refetch}
        />
      ) : null}
    </SheetPage>
  );
}

/** Whoever could be a technical authority: an administrator never. */
function useCandidates() {
  const { present } = usePeople();
  return (present ?? []).filter(({ roles }) => !roles.includes('administrator'));
}

function AppointmentNotes() {
  const { settings } = useSettings();
  return (
    <>
      <MarginNote title="Who may do what">
        <p>An administrator proposes.</p>
        <p>
          A second person confirms, with their password: another technical authority, or the principal of the
          office{settings ? (settings.principal ? `, ${settings.principal.name}` : ' (nobody is named)') : ''}
          . Never an administrator, never the person proposed.
        </p>
        <p>An administrator or a technical authority ends an appointment, with a reason.</p>
      </MarginNote>
      <MarginNote title="When it ends">
        New approvals stop. What was approved under it stays approved.
      </MarginNote>
    </>
  );
}
