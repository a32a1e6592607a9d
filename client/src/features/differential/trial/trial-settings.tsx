import { useLedger } from '../ledger/ledger-context';
import { withOverlap } from './trial';
import { TriedNumber } from './tried-number';

const outOf100 = (fraction: number) => Math.round(fraction * 1000) / 10;

/** Tries how much the findings count, how far they overlap, and how many patients have several candidates at once. */
export function TrialSettings() {
  const { reading, saved } = useLedger();
  const { trial } = reading;
  const { settings } = saved;
  return (
    <div className="tried-lines">
      <TriedNumber
        label="Every finding counts so many of 100 of its strength"
        saved={outOf100(settings.tempering)}
        tried={trial.tempering === null ? null : outOf100(trial.tempering)}
        low={30}
        high={100}
        onTry={(value) => {
          reading.tryOut({ ...trial, tempering: value === undefined ? null : value / 100 });
        }}
      />
      <TriedNumber
        label="Of 100 patients like this, so many have two or more at once"
        saved={outOf100(settings.coexistence)}
        tried={trial.coexistence === null ? null : outOf100(trial.coexistence)}
        low={0}
        high={50}
        onTry={(value) => {
          reading.tryOut({ ...trial, coexistence: value === undefined ? null : value / 100 });
        }}
      />
      {settings.groups.map((group) => (
        <TriedNumber
          key={group.id}
          label={`Overlap of “${group.label}”, of 100`}
          saved={outOf100(group.overlap)}
          tried={trial.overlaps[group.id] === undefined ? null : outOf100(trial.overlaps[group.id] ?? 0)}
          low={0}
          high={100}
          onTry={(value) => {
            reading.tryOut(withOverlap(trial, group.id, value === undefined ? undefined : value / 100));
          }}
        />
      ))}
    </div>
  );
}
