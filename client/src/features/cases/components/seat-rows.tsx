import { Button, TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { FormField } from '../../../components/form-field';
import { parseWeight, type Seat } from './team-form';

interface Props {
  seats: Seat[];
  faults: readonly FieldFault[];
  /** Weights do not change while a sealed round is open. */
  weightsFrozen: boolean;
  onChange: (seat: Seat, change: Partial<Seat>) => void;
  onRemove: (seat: Seat) => void;
}

/** The people in one part; for contributors with how much each counts and why. */
export function SeatRows({ seats, faults, weightsFrozen, onChange, onRemove }: Props) {
  return (
    <ul className="seat-list">
      {seats.map((seat) => (
        <li key={seat.personId}>
          <div>
            <span className="row-title">{seat.name}</span>
            <p className="soft small">{seat.from}</p>
          </div>
          {seat.part === 'contributor' && (
            <div className="seat-weight">
              <FormField label="Weight" path={`seats.${seat.personId}.weight`} faults={faults}>
                {(control) => (
                  <TextField.Root
                    {...control}
                    className="figures"
                    inputMode="decimal"
                    aria-label={`Weight of ${seat.name}, 0 to 3`}
                    disabled={weightsFrozen}
                    value={seat.weight}
                    onChange={(event) => {
                      onChange(seat, { weight: event.target.value });
                    }}
                  />
                )}
              </FormField>
              {parseWeight(seat.weight) !== 1 && (
                <FormField label="Why not 1" path={`seats.${seat.personId}.reason`} faults={faults}>
                  {(control) => (
                    <TextField.Root
                      {...control}
                      aria-label={`Why the weight of ${seat.name} is not 1`}
                      disabled={weightsFrozen}
                      value={seat.reason}
                      onChange={(event) => {
                        onChange(seat, { reason: event.target.value });
                      }}
                    />
                  )}
                </FormField>
              )}
            </div>
          )}
          <Button
            type="button"
            size="1"
            variant="outline"
            color="gray"
            highContrast
            aria-label={`Take ${seat.name} off the team`}
            onClick={() => {
              onRemove(seat);
            }}
          >
            Take off
          </Button>
        </li>
      ))}
    </ul>
  );
}
