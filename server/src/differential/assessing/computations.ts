import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { assess, type Assessment, type StandingOnly } from '@weighhouse/shared/reasoning/assess';

/** What lists show of an assessment. */
export interface Leading {
  standing: number[];
  disagreementBits: number;
}

/** What can be asked about a panel, each by its name, so that a thread can be asked for it too. */
export interface Answers {
  whole: Assessment;
  standing: StandingOnly;
  leading: Leading;
}
export type Asked = keyof Answers;

/** Every computation of a panel on the server, all through the one method. @throws PanelRefused */
export const computations: { [K in Asked]: (panel: PanelView) => Answers[K] } = {
  whole: (panel) => assess(panel),
  standing: (panel) => assess(panel, { only: 'standing' }),
  leading: (panel) => {
    // How far people are apart is told under one cause whatever the panel assumes, which is far less to compute.
    const { standing, disagreementBits } = assess({ ...panel, coexistence: 0 });
    return {
      standing: panel.coexistence > 0 ? computations.standing(panel).standing : standing,
      disagreementBits,
    };
  },
};
