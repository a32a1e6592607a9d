import { assess } from '@weighhouse/shared/reasoning/assess';
import type { Panel } from '@weighhouse/shared/reasoning/panel';

/** Assesses a panel beside the page, which stays awake meanwhile. Answers null where the panel is refused. */
addEventListener('message', ({ data }: MessageEvent<Panel>) => {
  try {
    postMessage(assess(data));
  } catch {
    postMessage(null);
  }
});
