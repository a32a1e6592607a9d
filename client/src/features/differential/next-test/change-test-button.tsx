import { Button } from '@radix-ui/themes';
import type { Finding } from '@weighhouse/shared/contracts/findings';

interface Props {
  finding: Finding;
  /** Null for whoever may not change it; then there is no button. */
  onChange: ((finding: Finding) => void) | null;
}

/** Opens what a pending finding takes to be changed. */
export function ChangeTestButton({ finding, onChange }: Props) {
  if (!onChange) return null;
  return (
    <Button
      variant="outline"
      size="1"
      aria-label={`Change cost, wait or burden of ${finding.title}`}
      onClick={() => {
        onChange(finding);
      }}
    >
      Change cost, wait or burden
    </Button>
  );
}
