import { describe, expect, it } from 'vitest';
import { placesOf } from './navigation';

const labels = (...roles: Parameters<typeof placesOf>[0]) => placesOf(roles).map((place) => place.label);

describe('placesOf', () => {
  it('leads people who open no case to none', () => {
    expect(labels('liaison')).toEqual(['Today', 'Tell']);
    expect(labels('administrator')).toEqual(['Today', 'People']);
    expect(labels('liaison', 'administrator')).toEqual(['Today', 'Tell', 'People']);
  });

  it('adds up the places of several roles', () => {
    expect(labels('specialist')).toEqual(['Today', 'Cases']);
    expect(labels('liaison', 'referrer')).toEqual(['Today', 'Cases', 'Tell']);
  });
});
