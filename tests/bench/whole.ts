/** A whole run() of a meter against one solve, and 500 meters in one file against one, through the real command line. */
import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { decode, encode } from '../../src/core/document/codec.ts';
import type { MeterText, Project } from '../../src/core/document/project.ts';
import { run } from '../../src/core/run.ts';
import { compare, inTurn, ratioOf, type Work } from './pairs.ts';
import { type Line, ratioLine } from './report.ts';

const MANY = 500;
const PAIRS = 15;

function example(root: string): Project {
  const project = decode(readFileSync(join(root, 'public/examples/tern-island.headwright.json'), 'utf8'));
  if (!project.ok) throw new Error(`expected the example project, got ${JSON.stringify(project.problems)}`);
  return project.value;
}

const copies = (project: Project, count: number): Project => ({
  ...project,
  meters: Array.from({ length: count }, (_, at) => {
    const meter = project.meters[at % project.meters.length] as MeterText;
    return { ...meter, tag: `FE-${1001 + at}` };
  }),
});

/** Something of every meter, so that none can be left out. */
const figure = (project: Project): number =>
  run(project).results.reduce((sum, one) => {
    if (one.status !== 'solved') throw new Error(`expected a solved meter, got ${JSON.stringify(one)}`);
    return sum + one.pipe_m;
  }, 0);

function commandLine(root: string, project: Project): Line {
  const folder = join(root, '.build/bench');
  mkdirSync(folder, { recursive: true });
  const solve = (count: number): (() => number) => {
    const file = join(folder, `${count}.headwright.json`);
    writeFileSync(file, encode(copies(project, count)));
    return () => {
      const started = performance.now();
      const { status, stdout } = spawnSync('node', [join(root, 'src/app/headwright.mjs'), 'solve', file], {
        encoding: 'utf8',
        maxBuffer: 1e9,
      });
      const time = (performance.now() - started) / 1000;
      const { results } = JSON.parse(stdout) as { results: unknown[] };
      if (status !== 0 || results.length !== count)
        throw new Error(`expected ${count} meters solved, got exit ${status}`);
      return time;
    };
  };
  const [one, many] = [solve(1), solve(MANY)];
  one();
  const times = Array.from({ length: PAIRS }, () => [many(), one()] as const);
  return ratioLine(`command line: ${MANY} meters in one file / one meter`, ratioOf(times), '< 10');
}

export function whole(root: string, flow: Work): Line[] {
  const project = example(root);
  const singles = project.meters.map((meter) => ({ ...project, meters: [meter] }));
  const many = copies(project, MANY);
  const one = inTurn(singles, figure);
  return [
    ratioLine('run() of one meter / one flow solve', compare(one, flow)),
    ratioLine(`run() of ${MANY} meters / one meter`, compare(inTurn([many], figure), one)),
    commandLine(root, project),
  ];
}
