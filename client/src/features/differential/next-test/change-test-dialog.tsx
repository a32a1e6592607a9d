import { Dialog } from '@radix-ui/themes';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { FindingForm } from '../evidence/finding-form';

interface Props {
  differential: Differential;
  /** The finding to change; null keeps the dialog shut. */
  finding: Finding | null;
  onClose: () => void;
}

/** A pending finding's form, where the ranking is: what finding out would take is mostly learnt there. */
export function ChangeTestDialog({ differential, finding, onClose }: Props) {
  // The version of somebody else that came meanwhile is shown beside one's own by the form.
  const current = differential.findings.find((one) => one.id === finding?.id) ?? null;
  return (
    <Dialog.Root
      open={finding !== null}
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
    >
      <Dialog.Content className="change-test" aria-describedby={undefined}>
        <Dialog.Title size="4">Change this finding</Dialog.Title>
        {current && (
          <FindingForm
            caseId={differential.caseId}
            finding={current}
            groups={differential.settings.groups}
            onDone={onClose}
            onCancel={onClose}
          />
        )}
      </Dialog.Content>
    </Dialog.Root>
  );
}
