/** What the command line finds for a project file, spelled by the one rounding rule. */
import { spawnSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { TestInfo } from '@playwright/test';
import type { DutyName, MeterText, Project } from '../../src/core/document/project.ts';
import type { PointRecord, Solved } from '../../src/core/result/record.ts';
import { type Context, contextOf } from '../../src/views/present/context.ts';
import type { DutyColumn, Value } from '../../src/views/present/model.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));

export interface Figures {
  readonly tag: string;
  readonly solved: Solved;
  readonly bore: Value;
  readonly pipe: Value;
  readonly ratio: Value;
  readonly density: Value;
  readonly viscosity: Value;
  readonly duty: Readonly<Partial<Record<DutyName, Readonly<Record<DutyColumn, Value>>>>>;
}

/** The figures of every solved meter of a file. */
export function solveHeadless(text: string, info: TestInfo): readonly Figures[] {
  const file = info.outputPath('asked.headwright.json');
  writeFileSync(file, text);
  const run = spawnSync(process.execPath, ['src/app/headwright.mjs', 'solve', file], { cwd: root, encoding: 'utf8' });
  if (run.stdout === '') throw new Error(`expected results, got exit ${run.status}: ${run.stderr}`);
  const project: Project = JSON.parse(text);
  const results: readonly (Solved | { readonly status: 'refused' })[] = JSON.parse(run.stdout).results;
  return results.flatMap((result, index) =>
    result.status === 'solved' ? [figuresOf(project.meters[index] ?? {}, project, result)] : [],
  );
}

function figuresOf(meter: MeterText, project: Project, solved: Solved): Figures {
  const at = contextOf(meter, project);
  const { boreAsMeasured_m: bore, diameterRatio } = solved;
  if (bore === undefined || diameterRatio === undefined) throw new Error(`expected a bore of ${solved.tag}, got none`);
  const { density_kg_m3, viscosity_Pa_s } = solved.state;
  const duty = Object.entries(solved.points).map(([name, point]) => [
    name,
    dutyOf(at, solved, name as DutyName, point),
  ]);
  return {
    tag: solved.tag,
    solved,
    bore: solved.find === 'bore' ? at.value(bore, 'bore') : at.given(meter.element?.bore, ['length'], bore, 'bore'),
    pipe: at.given(meter.pipe?.bore, ['length'], solved.pipeAsMeasured_m, 'bore'),
    ratio: at.value(diameterRatio, 'ratio'),
    density: at.value(density_kg_m3, 'density'),
    viscosity: at.value(viscosity_Pa_s, 'viscosity'),
    duty: Object.fromEntries(duty),
  };
}

function dutyOf(at: Context, { find }: Solved, name: DutyName, point: PointRecord): Record<DutyColumn, Value> {
  const { value } = at;
  const { permanentLoss_Pa: loss, uncertainty } = point;
  if (loss === undefined || uncertainty.expanded_percent === undefined)
    throw new Error('expected a loss and an uncertainty, got none');
  return {
    flow: find === 'flow' && name === 'maximum' ? at.flow(point) : at.givenFlow(at.meter.duty?.[name], point),
    differential: value(point.differential_Pa, 'differential'),
    reynolds: value(point.reynoldsPipe, 'reynolds'),
    coefficient: value(point.C, 'coefficient'),
    expansibility: value(point.epsilon, 'factor'),
    loss: value(loss, 'loss'),
    velocity: value(point.velocityPipe_m_s, 'velocity'),
    uncertainty: value(uncertainty.expanded_percent, 'uncertainty'),
  };
}
