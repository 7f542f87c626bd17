import { describe, expect, test } from 'vitest';
import { ADDRESSES, addressFacts, dimensionOf, nearestAddress } from '../../src/steps/addresses.ts';

describe('addresses', () => {
  test.each([
    ['pressure', 'pressure'],
    ['flows.Ar', 'flow'],
    ['lengths.gap', 'length'],
    ['targets.ti.voltage', 'voltage'],
    ['targets.energy', 'energy'],
    ['melts.al.temperature', 'temperature'],
    ['wafer.feature.width', 'length'],
    ['wafer.count', 'number'],
  ])('%s holds a %s', (address, dimension) => {
    expect(dimensionOf(address)).toBe(dimension);
  });

  test.each([
    '',
    'flows',
    'flows.',
    'presure',
    'targets.ti.colour',
    'lengths.a.b',
    'a.b.c.d',
    'constructor',
    'other.x',
  ])('no step has a setpoint %j', (address) => {
    expect(dimensionOf(address)).toBeUndefined();
  });

  test.each([
    ['presure', 'pressure'],
    ['flow.Ar', 'flows.Ar'],
    ['target.ti.voltage', 'targets.ti.voltage'],
    ['targets.ti.voltge', 'targets.ti.voltage'],
    ['temperature.wall', 'temperatures.wall'],
  ])('%s was meant as %s', (address, meant) => {
    expect(nearestAddress(address)).toBe(meant);
  });

  test('every pattern is found again and says what it holds', () => {
    for (const { pattern, says } of ADDRESSES) {
      expect(addressFacts(pattern.replace('*', 'x'))?.pattern).toBe(pattern);
      expect(says.length).toBeGreaterThan(5);
    }
  });
});
