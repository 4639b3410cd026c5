import { expect, test } from 'vitest';
import { governingByRegulator, governingConditions } from '#core/record/governing.ts';
import { sampleCondition, sampleLimit, sampleRegulator, sampleResult } from './record-sample.ts';

const within = (junctionC: number) =>
  sampleRegulator('U1', { junctionC, limits: [sampleLimit('junctionC', junctionC, 110, 'within')] });

test('governing condition – two within – the one with the least junction margin', () => {
  const result = sampleResult([sampleCondition('Mild', [within(80)]), sampleCondition('Hot', [within(97)])]);
  expect(governingByRegulator(result).get('U1')).toMatchObject({ condition: { name: 'Hot' }, limit: { margin: 13 } });
});

test('governing condition – input voltage over, junction cooler than elsewhere – the exceedance governs, with its limit', () => {
  const over = sampleRegulator('U1', {
    junctionC: 70,
    limits: [sampleLimit('junctionC', 70, 110, 'within'), sampleLimit('inputV', 17, 16, 'over')],
    verdict: 'over',
  });
  const result = sampleResult([sampleCondition('Hot', [within(97)]), sampleCondition('Surge', [over])]);
  expect(governingByRegulator(result).get('U1')).toMatchObject({
    condition: { name: 'Surge' },
    limit: { quantity: 'inputV', margin: -1 },
  });
});

test('governing condition – over in one, not evaluated in another – the exceedance is not hidden', () => {
  const over = sampleRegulator('U1', { limits: [sampleLimit('junctionC', 121, 110, 'over')], verdict: 'over' });
  const open = sampleRegulator('U1', {
    junctionC: null,
    limits: [sampleLimit('junctionC', null, 110, 'not evaluated')],
    verdict: 'not evaluated',
  });
  const result = sampleResult([sampleCondition('Hot', [over]), sampleCondition('Unknown load', [open])]);
  expect(governingByRegulator(result).get('U1')?.condition.name).toBe('Hot');
});

test('governing condition – not evaluated in one, within in another – the missing input governs', () => {
  const open = sampleRegulator('U1', { junctionC: null, limits: [], verdict: 'not evaluated' });
  const result = sampleResult([sampleCondition('Hot', [within(97)]), sampleCondition('Unknown load', [open])]);
  expect(governingByRegulator(result).get('U1')?.condition.name).toBe('Unknown load');
});

test('governing conditions – a board without regulators – every condition', () => {
  const result = sampleResult([sampleCondition('Hot', []), sampleCondition('Cold', [])]);
  expect(governingConditions(result).map(({ name }) => name)).toEqual(['Hot', 'Cold']);
});
