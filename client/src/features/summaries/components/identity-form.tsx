import './summaries.css';
import { Button } from '@radix-ui/themes';
import type { Identity } from '@weighhouse/shared/contracts/summaries';
import { useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { useOpenIdentity } from '../api/open-identity';
import { IdentityCard } from './identity-card';
import { IdentityFields } from './identity-fields';

/**
 * The patient's identity card, for the case's referrer and liaison. It is read only when somebody opens it, and shut
 * again when they leave, because every opening stands in the trail.
 */
export function IdentityForm({ caseId }: { caseId: string }) {
  const open = useOpenIdentity(caseId);
  const [identity, setIdentity] = useState<Identity | null>(null);
  const [editing, setEditing] = useState(false);
  const read = () => {
    open.mutate(undefined, { onSuccess: setIdentity });
  };

  if (!identity)
    return (
      <div className="identity">
        <p className="soft small prose">
          Name, birth date and how to be reached. Kept apart from the case, for its referrer and its liaison
          alone. Each opening is written into the trail with your name.
        </p>
        <FailureLine error={open.error} />
        <Button type="button" variant="outline" loading={open.isPending} onClick={read}>
          Open the identity card
        </Button>
      </div>
    );

  const mayWrite = identity.abilities.includes('identity.write');
  const shut = () => {
    setIdentity(null);
    setEditing(false);
  };
  if (mayWrite && (editing || identity.card === null))
    return (
      <IdentityFields
        caseId={caseId}
        identity={identity}
        onSaved={(saved) => {
          setIdentity(saved);
          setEditing(false);
        }}
        onClose={
          identity.card === null
            ? shut
            : () => {
                setEditing(false);
              }
        }
      />
    );
  return (
    <div className="identity">
      {identity.card ? (
        <IdentityCard card={identity.card} />
      ) : (
        <p className="soft">Nobody has filled in the card yet.</p>
      )}
      <div className="actions">
        {mayWrite && (
          <Button
            type="button"
            variant="outline"
            onClick={() => {
              setEditing(true);
            }}
          >
            Change the card
          </Button>
        )}
        <Button type="button" variant="outline" onClick={shut}>
          Shut the card
        </Button>
      </div>
    </div>
  );
}
