import { Button } from '@radix-ui/themes';
import { zoomed } from './zoom';

/** Smaller and larger, with the zoom between them. */
export function ZoomButtons({ zoom, onZoom }: { zoom: number; onZoom: (zoom: number) => void }) {
  const step = (direction: 1 | -1, label: string, mark: string) => (
    <Button
      type="button"
      size="1"
      variant="outline"
      color="gray"
      highContrast
      aria-label={label}
      disabled={zoomed(zoom, direction) === zoom}
      onClick={() => {
        onZoom(zoomed(zoom, direction));
      }}
    >
      {mark}
    </Button>
  );
  return (
    <span className="actions" role="group" aria-label="Zoom">
      {step(-1, 'Smaller', '−')}
      <span className="figures small" role="status">
        {Math.round(zoom * 100)}%
      </span>
      {step(1, 'Larger', '+')}
    </span>
  );
}
