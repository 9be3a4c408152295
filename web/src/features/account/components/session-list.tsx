import { Button } from 'antd';
import { useState } from 'react';
import type { OwnSession } from '../../../shared/api/types';
import { formatMinute } from '../../../shared/format/format-date';
import { useAct } from '../../../shared/hooks/use-act';
import { DoneNote } from '../../../shared/ui/done-note';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { endSession } from '../api/use-own-sessions';
import { agentWords } from '../model/agent-words';
import './account.css';

interface SessionListProps {
  sessions: readonly OwnSession[];
  refetch: () => Promise<unknown>;
}

/** Where somebody is signed in; every session but the one in use can be ended from here. */
export function SessionList({ sessions, refetch }: SessionListProps) {
  const { working, problem, run } = useAct();
  const [ending, setEnding] = useState<string | null>(null);
  const [done, setDone] = useState('');
  const end = async ({ id, agent }: OwnSession) => {
    setEnding(id);
    setDone('');
    const ended = await run(() => endSession(id));
    await refetch();
    if (ended) setDone(`The session with ${agentWords(agent)} has ended.`);
  };
  return (
    <>
      <ul className="sessions">
        {sessions.map((session) => (
          <li key={session.id}>
            <span>
              {agentWords(session.agent)}
              {session.current ? <strong>, this one</strong> : null}
              <span className="session-note">
                last seen <time dateTime={session.lastSeenAt}>{formatMinute(session.lastSeenAt)}</time>,
                signed in <time dateTime={session.createdAt}>{formatMinute(session.createdAt)}</time>
              </span>
            </span>
            {session.current ? null : (
              <Button
                size="small"
                loading={working && ending === session.id}
                aria-label={`End the session with ${agentWords(session.agent)}, last seen ${formatMinute(session.lastSeenAt)}`}
                onClick={() => void end(session)}
              >
                End
              </Button>
            )}
          </li>
        ))}
      </ul>
      {sessions.length === 1 ? <p className="account-words">You are signed in nowhere else.</p> : null}
      <DoneNote words={done} />
      {problem ? <ProblemNotice problem={problem} /> : null}
    </>
  );
}
