import { act, cleanup, renderHook } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import { readPreference, useUnitsPreference } from '~/islands/shared/units-preference';

afterEach(() => {
  cleanup();
  localStorage.clear();
});

it('remembers the units of each person apart', () => {
  const { result } = renderHook(() => useUnitsPreference('tove'));
  act(() => result.current[1]({ length: 'in', volume: 'impgal' }));
  act(() => result.current[1]({ paper: 'letter' }));
  expect(result.current[0]).toEqual({ length: 'in', volume: 'impgal', paper: 'letter' });
  expect(readPreference('tove')).toEqual({ length: 'in', volume: 'impgal', paper: 'letter' });
  expect(readPreference('callum')).toEqual({ length: 'mm', volume: 'l', paper: 'a4' });
});

it('takes the usual units where what was kept cannot be read', () => {
  localStorage.setItem('dipwright.units.tove', '{"volume":"gal"}');
  expect(readPreference('tove').volume).toBe('l');
  localStorage.setItem('dipwright.units.tove', 'no json');
  expect(readPreference('tove').length).toBe('mm');
});
