import type { Role } from '@weighhouse/shared/contracts/people';

export interface Place {
  to: string;
  label: string;
}

/**
 * The places a person has, by role. A liaison and an administrator open no case, so those who are nothing else do not
 * get the list of cases.
 */
export function placesOf(roles: readonly Role[]): Place[] {
  const clinical = roles.some((role) => role === 'referrer' || role === 'specialist' || role === 'chair');
  const places: Place[] = [{ to: '/', label: 'Today' }];
  if (clinical) places.push({ to: '/cases', label: 'Cases' });
  if (roles.includes('liaison')) places.push({ to: '/tell', label: 'Tell' });
  if (roles.includes('administrator')) places.push({ to: '/people', label: 'People' });
  return places;
}
