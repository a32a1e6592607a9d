/**
 * A beam reaches this many decibans (about 4 times as often) to each side of its centre line; what goes beyond gets an
 * arrow. Tempered and pooled rows carry one to four, which a longer reach would draw as a few pixels.
 */
export const beamReach = 6;

/** A beam in percent of its lane's width, which side it lies on and whether it goes beyond the lane. */
export interface BeamShape {
  start: number;
  width: number;
  side: 'for' | 'against' | 'neither';
  beyond: boolean;
}

/**
 * Where a weight of evidence lies in its lane: 0 at the left end, 50 on the centre line, 100 at the right end.
 * @param decibans any finite number; what goes beyond the reach is held at the end of the lane
 */
export function beamPlace(decibans: number): number {
  const held = Math.max(-beamReach, Math.min(beamReach, decibans));
  return 50 + (held / beamReach) * 50;
}

/** The beam of a weight of evidence: from the centre line to the right where it counts for, to the left against. */
export function beamShape(decibans: number): BeamShape {
  const end = beamPlace(decibans);
  return {
    start: Math.min(50, end),
    width: Math.abs(end - 50),
    side: decibans > 0 ? 'for' : decibans < 0 ? 'against' : 'neither',
    beyond: Math.abs(decibans) > beamReach,
  };
}

/** A share (0 to 1) in percent of a scale that begins at zero, held inside it. */
export function barPlace(share: number): number {
  return Math.max(0, Math.min(1, share)) * 100;
}
