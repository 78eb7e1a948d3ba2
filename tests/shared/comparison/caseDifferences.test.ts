import type { CaseFile } from '../../../shared/case/caseFile';
import { caseDifferences } from '../../../shared/comparison/caseDifferences';
import { sampleCase } from '../../server/results/sampleRun';

const changed = (change: Partial<CaseFile>): CaseFile => ({ ...sampleCase(), ...change });

test('equal cases differ in nothing, whatever they are called', () => {
  expect(caseDifferences([sampleCase(), changed({ title: 'Another' })], 'metric')).toEqual([]);
});

test('a default that is written out is no difference', () => {
  const { numerics } = sampleCase();
  const full = changed({ gravity: 9.80665, numerics: { ...numerics, order: 2, courant: 0.8 } });
  expect(caseDifferences([sampleCase(), full], 'metric')).toEqual([]);
});

test('each input that differs is a line with what every run was given, in the study’s units', () => {
  const { numerics } = sampleCase();
  const other = changed({
    upstream: { kind: 'inflow', times: [0, 1800, 7200], flows: [10, 120, 10] },
    downstream: { kind: 'normalDepth', slope: 0.002 },
    numerics: { ...numerics, cellSize: 50 },
    roughnessFactors: [{ from: 0, to: 2500, part: 'channel', depths: [0], factors: [1.2] }],
  });
  expect(caseDifferences([sampleCase(), other, sampleCase()], 'metric')).toEqual([
    { part: 'Inflow', what: 'peak', values: ['100 m³/s', '120 m³/s', '100 m³/s'] },
    {
      part: 'Inflow',
      what: 'table',
      values: ['3 values over 2 h 00 (a)', '3 values over 2 h 00 (b)', '3 values over 2 h 00 (a)'],
    },
    { part: 'Outlet', what: 'slope', values: ['0.00100 m/m', '0.00200 m/m', '0.00100 m/m'] },
    {
      part: 'Multiplier of n 1',
      what: 'value',
      values: [null, '× 1.200, channel, 0.00 km to 2.50 km', null],
    },
    { part: 'Settings', what: 'cell size', values: ['25.0 m', '50.0 m', '25.0 m'] },
  ]);
  const [{ values }] = caseDifferences([sampleCase(), other], 'usCustomary');
  expect(values).toEqual(['3,531 ft³/s', '4,238 ft³/s']);
});

test('a change beyond the digits shown is told all the same', () => {
  const { numerics } = sampleCase();
  const other = changed({ numerics: { ...numerics, cellSize: 25.01 } });
  expect(caseDifferences([sampleCase(), other], 'metric')).toEqual([
    { part: 'Settings', what: 'cell size', values: ['25.0 m (a)', '25.0 m (b)'] },
  ]);
});

test('sections: shape, roughness and banks, and those that a run does not have', () => {
  const { sections } = sampleCase();
  const [first, , last] = sections;
  const other = changed({
    sections: [{ ...first, roughness: [[0, 0.05]], banks: [11, 22] }, last],
  });
  expect(caseDifferences([sampleCase(), other], 'metric')).toEqual([
    { part: 'Section XS-01', what: 'Manning’s n', values: ['0.04', '0.05'] },
    {
      part: 'Section XS-01',
      what: 'banks',
      values: ['10.0 m and 22.0 m', '11.0 m and 22.0 m'],
    },
    { part: 'Section =XS-02', what: 'chainage', values: ['1.00 km', null] },
    { part: 'Section =XS-02', what: 'shape', values: ['6 points, lowest 49.00 m', null] },
    { part: 'Section =XS-02', what: 'Manning’s n', values: ['0.04', null] },
    { part: 'Section =XS-02', what: 'banks', values: ['10.0 m and 22.0 m', null] },
  ]);
});
