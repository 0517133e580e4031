import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { decode } from '../../../src/core/document/codec.ts';
import { run } from '../../../src/core/run.ts';
import { solveText } from '../../../src/views/headless/solve.ts';
import { presentSheets } from '../../../src/views/present/sheet.ts';
import { presentSurveySheets } from '../../../src/views/present/survey-sheet.ts';
import { sheetText, surveyText } from './text.ts';

const folder = new URL('../../../public/examples/', import.meta.url);
const files = readdirSync(folder).filter((name) => name.endsWith('.headwright.json'));

it('there is an example to print', () => expect(files).toContain('tern-island.headwright.json'));

describe.each(files)('%s', (name) => {
  const project = decode(readFileSync(new URL(name, folder), 'utf8'));
  if (!project.ok) throw new Error(`expected a project in ${name}, got ${project.problems[0].code}`);
  it('golden of its sheets', async () => {
    const sheets = presentSheets({ project: project.value, results: run(project.value) });
    expect(sheets).toHaveLength(project.value.meters.length);
    const surveys = presentSurveySheets({ project: project.value, results: run(project.value) });
    expect(surveys).toHaveLength(project.value.traverses?.length ?? 0);
    const golden = `../../examples/${name.replace('.headwright.json', '.sheet.txt')}`;
    await expect([...sheets.map(sheetText), ...surveys.map(surveyText)].join('\n')).toMatchFileSnapshot(golden);
  });
  it('carries the fingerprint that the command line prints', () => {
    const sheets = presentSheets({ project: project.value, results: run(project.value) });
    const surveys = presentSurveySheets({ project: project.value, results: run(project.value) });
    const { results, traverses } = JSON.parse(solveText(readFileSync(new URL(name, folder), 'utf8')).output);
    expect([...sheets, ...surveys].map(({ head }) => head.status.split(' ').at(-1))).toEqual(
      [...results, ...traverses].map(({ inputs }: { inputs: string }) => inputs),
    );
  });
});
