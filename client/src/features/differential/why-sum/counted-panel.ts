import type { Panel } from '@weighhouse/shared/reasoning/panel';

/** So little that 1 less it is 1: the report then says the same whatever the cause, and moves nothing. */
const nothing = 1e-300;

/**
 * The panel with some findings counted and the other observed ones moving nothing. They stay observed, so that a group
 * keeps its size and every counted finding its strength: what one adds does not change when others of its group come.
 */
export function countedPanel(panel: Panel, counted: readonly string[]): Panel {
  const kept = new Set(counted);
  return {
    ...panel,
    findings: (panel.findings ?? []).map((finding) =>
      finding.observed == null || kept.has(finding.id) ? finding : { ...finding, reliability: nothing },
    ),
  };
}
