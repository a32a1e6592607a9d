import { Button } from '@radix-ui/themes';
import { FailureLine } from '../../../components/failure';
import { type ExportFormat, useDownloadExport } from '../../differential/api/download-export';

const files: readonly { format: ExportFormat; label: string; ability: string }[] = [
  { format: 'pdf', label: 'Differential and plan as PDF', ability: 'export.read' },
  { format: 'letter', label: 'Letter to the referrer', ability: 'export.read' },
  { format: 'fhir', label: 'FHIR bundle', ability: 'export.read' },
  { format: 'panel', label: 'Panel as JSON', ability: 'panel.read' },
];

/** What can be taken along, each with its progress and its refusal. */
export function Downloads({
  caseId,
  number,
  abilities,
}: {
  caseId: string;
  number: string;
  abilities: readonly string[];
}) {
  const download = useDownloadExport(caseId, number);
  const open = files.filter((file) => abilities.includes(file.ability));
  if (open.length === 0) return null;
  return (
    <section className="plan-downloads no-print" aria-label="Take it along">
      <h3>Take it along</h3>
      <div className="actions">
        {open.map(({ format, label }) => (
          <Button
            key={format}
            variant="outline"
            loading={download.isPending && download.variables === format}
            disabled={download.isPending}
            onClick={() => {
              download.mutate(format);
            }}
          >
            {label}
          </Button>
        ))}
        <Button
          variant="outline"
          onClick={() => {
            window.print();
          }}
        >
          Print
        </Button>
      </div>
      <FailureLine error={download.error} />
    </section>
  );
}
