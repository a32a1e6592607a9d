/**
 * A panel as it travels: what `assess` takes, what the server exports and what
 * `npm run assess` reads. Everything is a fraction, never a percentage.
 *
 * K candidates are columns 0 to K-1; column K is always *none of these*.
 * `assess` treats its input as untrusted, so these types describe what a caller
 * should send, not what is taken for granted.
 */
export type Exposure = 'seldom' | 'sometimes' | 'often';

/** P(present) of a two-level finding, or a share for each level; null is a blank, which is not an opinion. */
export type GivenCell = number | readonly number[] | null;

export interface PanelLikelihood {
  /** How often the contributor meets this finding; `often` if absent. */
  exposure?: Exposure;
  /** K+1 cells, *none of these* last. */
  given: readonly GivenCell[];
}

export interface PanelContributor {
  id: string;
  /** 0 to 3; 1 if absent. Weight 0 counts nowhere. */
  weight?: number;
  /** K+1 shares that sum to 1, each at least 0.001; null or absent: none given. */
  prior?: readonly number[] | null;
  /** Keyed by the id of the finding. */
  likelihoods?: Readonly<Record<string, PanelLikelihood>>;
}

export interface PanelFinding {
  id: string;
  /** 2 to 6; 2 if absent (0 absent, 1 present). */
  levels?: number;
  /** The level seen, or null (or absent) while the finding is pending. */
  observed?: number | null;
  /** Above 0 to 1; 1 if absent. Firm 1, fair 0.7, doubtful 0.4. */
  reliability?: number;
  /** The id of a group; null or absent: none. */
  group?: string | null;
  /** Money, 0 or more; 0 if absent. */
  cost?: number | null;
  /** Days, 0 or more; 0 if absent. */
  waitDays?: number | null;
  /** 0 to 3; 0 if absent. */
  burden?: number | null;
}

export interface PanelGroup {
  id: string;
  /** 0 (separate mechanisms) to 1 (the same finding twice). */
  overlap: number;
}

/** Candidates a and b occur together `times` (0 to 100) as often as chance says. */
export interface PanelPair {
  a: number;
  b: number;
  times: number;
}

export interface Panel {
  /** 1 to 30 distinct ids, without *none of these*. */
  candidates: readonly string[];
  /** Share of patients like this with two or more of the candidates, 0 to 0.5; 0 if absent. */
  coexistence?: number;
  /** 0.3 to 1; 1 if absent. */
  tempering?: number;
  together?: readonly PanelPair[];
  groups?: readonly PanelGroup[];
  /** At most 300. */
  findings?: readonly PanelFinding[];
  /** At most 25. */
  contributors?: readonly PanelContributor[];
}
