import { Button } from 'antd';
import { useState } from 'react';
import { ReasonDialog } from '../../../shared/form/reason-dialog';
import { useRefreshRevision } from '../../../shared/hooks/use-refresh-revision';
import { decline, reinstate, suspend, type RevisionKey } from '../api/review-calls';
import { WithdrawDialog } from './withdraw-dialog';

type ActName = 'decline' | 'suspend' | 'reinstate' | 'withdraw';

interface StandingActsProps {
  revisionKey: RevisionKey;
  geometry: string;
  /** Which of them the signed-in person may do. */
  abilities: Readonly<Partial<Record<ActName, boolean>>>;
}

interface ReasonedAct {
  verb: string;
  consequence: string;
  send: (key: RevisionKey, reason: string) => Promise<unknown>;
}

const REASONED: Readonly<Record<Exclude<ActName, 'withdraw'>, ReasonedAct>> = {
  decline: {
    verb: 'Decline',
    consequence:
      'The office does not take it into use, and its review ends here. This cannot be undone; a later try is a new revision.',
    send: decline,
  },
  suspend: {
    verb: 'Suspend',
    consequence:
      'While the problem is looked into, nothing may be checked or issued with it; the sheet says so in large type. It can be reinstated.',
    send: suspend,
  },
  reinstate: {
    verb: 'Reinstate',
    consequence: 'It is approved again, with the same content, and may be used for design.',
    send: reinstate,
  },
};
const ORDER: readonly ActName[] = ['reinstate', 'suspend', 'withdraw', 'decline'];

/** An authority's acts on the standing of a revision; each asks for its reason first. */
export function StandingActs({ revisionKey, geometry, abilities }: StandingActsProps) {
  const { slug, revision } = revisionKey;
  const [asking, setAsking] = useState<ActName | null>(null);
  const refresh = useRefreshRevision(slug);
  const close = () => setAsking(null);
  // Fetching anew may take this place itself away, so the dialog goes first.
  const done = async () => {
    close();
    await refresh();
  };
  const able = ORDER.filter((name) => abilities[name]);
  if (able.length === 0) return null;
  const reasoned = asking === null || asking === 'withdraw' ? null : REASONED[asking];
  return (
    <>
      {able.map((name) => (
        <Button key={name} onClick={() => setAsking(name)}>
          {name === 'withdraw' ? 'Withdraw' : REASONED[name].verb} revision {revision}
        </Button>
      ))}
      {asking === 'withdraw' ? (
        <WithdrawDialog revisionKey={revisionKey} geometry={geometry} onDone={done} onClose={close} />
      ) : null}
      {reasoned ? (
        <ReasonDialog
          about={`${reasoned.verb.toLowerCase()}:${slug}/${revision}`}
          title={`${reasoned.verb} revision ${revision}`}
          act={`${reasoned.verb} revision ${revision}`}
          notDone="Its standing is as before"
          onAct={async (reason) => {
            await reasoned.send(revisionKey, reason);
            await done();
          }}
          onLeave={close}
        >
          <p>{reasoned.consequence}</p>
        </ReasonDialog>
      ) : null}
    </>
  );
}
