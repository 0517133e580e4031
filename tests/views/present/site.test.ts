/** What a site suggests, in words. */
import { expect, it } from 'vitest';
import type { Project } from '../../../src/core/document/project.ts';
import { run } from '../../../src/core/run.ts';
import { siteSuggestions } from '../../../src/views/present/site.ts';

const suggestions = (site: Project['site'], display: Project['display'] = 'SI') => {
  const project: Project = { format: 'headwright', version: 1, meters: [], display, ...(site && { site }) };
  return siteSuggestions(project, run(project));
};

it('suggests nothing for a place that is not known', () => {
  expect(suggestions(undefined)).toEqual({});
  expect(suggestions({ atmosphere: '98 kPa(a)' })).toEqual({});
  expect(suggestions({ altitude: 'high' })).toEqual({});
});

it('says what is in use while nothing is stated', () => {
  const { 'site.atmosphere': air, 'site.gravity': g } = suggestions({ altitude: '350 m', latitude: '52 deg' });
  expect(air).toEqual({
    sentence: 'empty: 97.191\u00a0kPa(a), from 350\u00a0m',
    figure: '97.191\u00a0kPa(a)',
    file: '97.191 kPa(a)',
    taken: true,
  });
  expect(g?.sentence).toBe('empty: 9.8114\u00a0m/s², from 52° and 350\u00a0m');
});

it('suggests beside what is stated, in the units of the display', () => {
  const stated = { altitude: '1000 ft', latitude: '52 deg', atmosphere: '14.7 psi(a)', gravity: '9.8 m/s2' };
  const { 'site.atmosphere': air, 'site.gravity': g } = suggestions(stated, 'US');
  expect(air?.sentence).toBe('suggested from 1000\u00a0ft: 14.173\u00a0psi(a)');
  expect([air?.taken, air?.file, g?.taken, g?.file]).toEqual([false, '14.173 psi(a)', false, '9.8115 m/s2']);
});

it('has gravity from the latitude alone', () => {
  expect(suggestions({ latitude: '45 deg' })['site.gravity']?.sentence).toBe('empty: 9.8062\u00a0m/s², from 45°');
});
