/**
 * The rules of the house, each with a proof that it bites: a rule that finds nothing in a planted fault is no rule.
 * Every failure lists the files and says what is wrong with them.
 */
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { cruise, type ICruiseResult } from 'dependency-cruiser';
import { parseSync } from 'vite';
import { afterAll, describe, expect, it } from 'vitest';
import settings, { mayImport } from '../.dependency-cruiser.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));

interface Text {
  readonly path: string; // from the root, with slashes
  readonly text: string;
}

const read = (folder: string, name: RegExp): Text[] =>
  readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
    .map((path) => `${folder}/${path.replaceAll('\\', '/')}`)
    .filter((path) => name.test(path))
    .sort()
    .map((path) => ({ path, text: readFileSync(join(root, path), 'utf8') }));

const source = read('src', /\.(ts|tsx|mjs)$/);
const tests = read('tests', /\.(ts|tsx|mjs)$/).filter(({ path }) => path !== 'tests/house.test.ts');
const core = source.filter(({ path }) => path.startsWith('src/core/'));
const formulas = core.filter(({ path }) => !path.endsWith('.table.ts'));

/** The text of the comment without its stars, one line per line. */
const comment = (text: string): string => text.replaceAll(/^[ \t]*(\/\*\*|\*\/|\*|\/\/) ?/gm, '').replaceAll('*/', '');

describe('the import rule', () => {
  const folder = mkdtempSync(join(tmpdir(), 'house-'));
  afterAll(() => rmSync(folder, { recursive: true }));

  const judge = async (baseDir: string): Promise<ICruiseResult> => {
    const { output } = await cruise(['src'], {
      ...(settings.options as object),
      baseDir,
      ruleSet: { forbidden: settings.forbidden as never },
      validate: true,
    });
    if (typeof output === 'string') throw new Error(`expected a result object, got text: ${output}`);
    return output;
  };
  const complaints = ({ summary }: ICruiseResult): string[] =>
    summary.violations.map(({ rule, from, to }) => `${rule.name}: ${from} -> ${to}`);

  it('holds in src', async () => {
    const result = await judge(root);
    expect(complaints(result)).toEqual([]);
    expect(result.summary.totalCruised).toBeGreaterThan(100); // a tool that reads no module also reports no fault
  });

  const plain: Record<string, string> = {
    'src/core/quantity/kinds.ts': 'export type Length = number;',
    'src/core/document/project.ts': 'export interface Project { title: string }',
    'src/core/input/field.ts': "import type { Length } from '../quantity/kinds.ts'; export type Field = Length;",
    'src/core/fluid/water.ts': "import type { Length } from '../quantity/kinds.ts'; export type Water = Length;",
    'src/core/element/orifice.ts': "import type { Water } from '../fluid/water.ts'; export type Orifice = Water;",
    'src/core/element/registry.ts': "import type { Orifice } from './orifice.ts'; export type All = Orifice;",
    'src/core/solve/flow.ts': "import type { Orifice } from '../element/orifice.ts'; export type Flow = Orifice;",
    'src/core/result/record.ts': "import type { Flow } from '../solve/flow.ts'; export type Result = Flow;",
    'src/core/run.ts': "import type { Result } from './result/record.ts'; export type Run = Result;",
    'src/state/store.ts':
      "import type { Run } from '../core/run.ts'; import type { Project } from '../core/document/project.ts'; export type Store = Run | Project;",
    'src/views/words/labels.ts': "import type { Result } from '../../core/result/record.ts'; export type W = Result;",
    'src/views/present/rows.ts':
      "import type { Result } from '../../core/result/record.ts'; export type Rows = Result;",
    'src/views/screen/form.tsx':
      "import { useState } from 'react'; import type { Store } from '../../state/store.ts'; export const f = (s: Store) => useState(s);",
    'src/app/main.tsx':
      "import { f } from '../views/screen/form.tsx'; import { readFile } from 'node:fs'; f(readFile.length); export const tag = <p>{f.name}</p>;",
    'tests/given.ts': 'export const given = 1;',
  };

  const planted: [fault: string, rule: string, path: string, text: string][] = [
    ['a room looks forward', 'room-core-fluid', 'src/core/fluid/a.ts', "import '../element/orifice.ts';"],
    [
      'a type alone looks forward',
      'room-core-quantity',
      'src/core/quantity/a.ts',
      "import type { Field } from '../input/field.ts'; export type A = Field;",
    ],
    ['a stage looks back at the whole', 'room-core-solve', 'src/core/solve/a.ts', "import '../run.ts';"],
    ['a view computes', 'room-views-present', 'src/views/present/a.ts', "import '../../core/solve/flow.ts';"],
    ['the sheet reads the state', 'room-views-sheet', 'src/views/sheet/a.tsx', "import '../../state/store.ts';"],
    ['a view knows the app', 'room-views-screen', 'src/views/screen/a.ts', "import '../../app/main.tsx';"],
    ['storage knows the run', 'room-persist', 'src/persist/a.ts', "import '../core/run.ts';"],
    ['an element imports an element', 'elements-are-strangers', 'src/core/element/nozzle.ts', "import './orifice.ts';"],
    [
      'a longer name of the same start',
      'elements-are-strangers',
      'src/core/element/orifice-quarter.ts',
      "import './orifice.ts';",
    ],
    [
      'a fluid reads the form',
      'fluid-models-are-strangers-to-the-form',
      'src/core/fluid/b.ts',
      "import '../input/field.ts';",
    ],
    [
      'a folder of the same start as the file that may',
      'fluid-models-are-strangers-to-the-form',
      'src/core/fluid/stated/b.ts',
      "import '../../input/field.ts';",
    ],
    ['react outside its rooms', 'package-react', 'src/views/present/b.ts', "import 'react';"],
    ['recharts outside its room', 'package-recharts', 'src/views/screen/b.ts', "import 'recharts';"],
    ['decimals past the edge', 'package-decimal-js', 'src/core/solve/b.ts', "import 'decimal.js';"],
    ['a deep path into a package', 'package-react-dom', 'src/views/screen/c.ts', "import 'react-dom/client';"],
    ['a package without a row', 'every-package-has-its-rooms', 'src/core/log/a.ts', "import 'fast-check';"],
    ['a folder without a row', 'every-folder-is-a-room', 'src/gadget/a.ts', "import '../core/run.ts';"],
    ['node outside the app', 'node-only-in-app', 'src/persist/b.ts', "import 'node:fs';"],
    ['a path that leads nowhere', 'every-import-resolves', 'src/state/a.ts', "import './nowhere.ts';"],
    ['a circle', 'no-circle', 'src/core/numeric/a.ts', "import './b.ts';"],
    ['an orphan', 'no-orphan', 'src/core/numeric/c.ts', 'export const c = 1;'],
    ['source that knows a test', 'src-never-sees-tests', 'src/state/b.ts', "import '../../tests/given.ts';"],
  ];

  const write = (files: Record<string, string>): void => {
    for (const [path, text] of Object.entries(files)) {
      mkdirSync(join(folder, dirname(path)), { recursive: true });
      writeFileSync(join(folder, path), text);
    }
  };

  it('passes a clean house', async () => {
    symlinkSync(join(root, 'node_modules'), join(folder, 'node_modules'), 'junction');
    write(plain);
    const result = await judge(folder);
    expect(complaints(result)).toEqual([]);
    expect(result.summary.totalCruised).toBeGreaterThanOrEqual(Object.keys(plain).length - 1);
  });

  it('catches every planted fault by the rule meant for it', async () => {
    write(Object.fromEntries(planted.map(([, , path, text]) => [path, text])));
    write({ 'src/core/numeric/b.ts': "import './a.ts';" });
    const { summary } = await judge(folder);
    const missed = planted.filter(
      ([, rule, path]) => !summary.violations.some((found) => found.rule.name === rule && found.from === path),
    );
    expect(missed.map(([fault, rule]) => `${fault}: not caught by ${rule}`)).toEqual([]);
  });

  it('has a row for every folder, and a folder for every row that is not yet to come', () => {
    const later = ['core/compare'];
    const empty = Object.keys(mayImport).filter((room) => !source.some(({ path }) => path.startsWith(`src/${room}`)));
    expect(empty.filter((room) => !later.includes(room))).toEqual([]);
  });
});

describe('what is never written', () => {
  interface Ban {
    readonly name: string;
    readonly in: readonly Text[];
    readonly except?: RegExp; // paths that may
    readonly pattern: RegExp;
    readonly planted: string;
  }
  const bans: Ban[] = [
    {
      name: 'a way round the types',
      in: [...source, ...tests],
      pattern: /\bas any\b|@ts-ignore|@ts-nocheck/,
      planted: 'x as any',
    },
    {
      name: 'a test switched off',
      in: tests,
      pattern: /\b(it|test|describe)\.(skip|todo|only|fixme)\b/,
      planted: "it.skip('')",
    },
    {
      name: 'digits chosen outside core/quantity and views/present',
      in: source,
      except: /^src\/(core\/quantity|views\/present)\//,
      pattern: /\.to(Fixed|Precision|Exponential)\(/,
      planted: 'x.toFixed(2)',
    },
    {
      name: 'decimals outside core/quantity and core/input',
      in: source,
      except: /^src\/core\/(quantity|input)\//,
      pattern: /decimal\.js/,
      planted: "from 'decimal.js'",
    },
    {
      name: 'a clock or chance in the core',
      in: core,
      pattern: /\bDate\b\s*[.(]|\bMath\.random\b|\bperformance\.|\bcrypto\./,
      planted: 'Math.random()',
    },
    {
      name: 'a defect that does not say what it expected',
      in: core,
      pattern: /throw (?!new \w+\([^;]*\bexpected\b)/,
      planted: "throw new Error('bad');",
    },
    {
      name: 'a style or script inside the page',
      in: read('.', /^\.\/index\.html$/),
      pattern: /\sstyle=|\son\w+=|<style|<script(?![^>]*\ssrc=)/,
      planted: '<script>1</script>',
    },
  ];
  it.each(bans.map((ban) => [ban.name, ban] as const))('%s', (_name, { in: files, except, pattern, planted }) => {
    expect(pattern.test(planted)).toBe(true);
    expect(files.length).toBeGreaterThan(0);
    const found = files.filter(({ path, text }) => !except?.test(path) && pattern.test(text));
    expect(found.map(({ path, text }) => `${path}: ${pattern.exec(text)?.[0].trim()}`)).toEqual([]);
  });

  /** Lines that hold a coefficient and say neither there nor right above where it comes from. */
  const unexplained = (text: string): string[] => {
    const lines = text.split('\n');
    const isComment = (line = ''): boolean => /^\s*(\/\*|\*|\/\/)/.test(line) || line.includes('//');
    return lines.filter((line, at) => {
      const code = line.replaceAll(/'[^']*'|`[^`]*`|\/\*.*?\*\//g, '');
      const says = isComment(line) || isComment(lines[at - 1]) || /\b(source|clause|cite|iso\w*)\b/.test(line);
      return /[0-9]\.[0-9]{3,}/.test(code) && !says;
    });
  };
  it('a coefficient without its clause', () => {
    expect(unexplained('const b = 1;\nconst a = 0.5961;')).toHaveLength(1);
    const found = formulas.flatMap(({ path, text }) => unexplained(text).map((line) => `${path}: ${line.trim()}`));
    expect(found).toEqual([]);
  });

  it('a name that says nothing', () => {
    const empty = /(^|[-/])(utils?|helpers?|managers?|misc|common|index|data2)(\.|\/)/;
    expect(empty.test('src/core/utils.ts')).toBe(true);
    expect(source.map(({ path }) => path).filter((path) => empty.test(path))).toEqual([]);
  });
});

describe('elements', () => {
  const exported = /export const (\w+)(: Element\b| = \{[\s\S]*\} satisfies Element\b)/;
  const elements = core.filter(({ path, text }) => /^src\/core\/element\/[^/]+$/.test(path) && exported.test(text));
  const registry = source.find(({ path }) => path === 'src/core/element/registry.ts')?.text ?? '';
  const header = new RegExp(
    [
      String.raw`^[A-Z][^|]*, [^|]+\.`,
      String.raw`Standard: [^|]+:\d{4}[^|]*, clauses: geometry [^|]+, discharge [^|]+, expansibility [^|]+, uncertainty [^|]+, limits [^|]+\.`,
      String.raw`Symbols: clause [^|]+, SI\.`,
      String.raw`Departs: (none|[^|]+: [^|]+, because [^|]+)\.`,
    ].join(String.raw`\s*\|\s*`),
  );
  const fits = (text: string): boolean => {
    const opening = /^\/\*\*[\s\S]*?\*\//.exec(text)?.[0] ?? '';
    return header.test(
      comment(opening)
        .replaceAll(/\s+/g, ' ')
        .replaceAll(/ (?=Standard:|Symbols:|Departs:)/g, ' | ')
        .trim(),
    );
  };

  it('are at least five', () => expect(elements.length).toBeGreaterThanOrEqual(5));

  it('open with the header that names standard, clauses, symbols and departures', () => {
    const good =
      'Plate, round hole.\n * Standard: ISO 1:2022, clauses: geometry 1, discharge 2, expansibility 3, uncertainty 4, limits 5.\n' +
      ' * Symbols: clause 3 of the standard, SI.\n * Departs: 5.1: the term is left out,\n *   because it is nil.\n */';
    expect(fits(`/**\n * ${good}`)).toBe(true);
    expect(fits(`/**\n * ${good.replace('Departs', 'Leaves')}`)).toBe(false);
    expect(elements.filter(({ text }) => !fits(text)).map(({ path }) => `${path}: header not in its form`)).toEqual([]);
  });

  it('stand in the registry', () => {
    const missing = elements.filter(({ path, text }) => {
      const name = exported.exec(text)?.[1] ?? '';
      const file = path.slice(path.lastIndexOf('/') + 1);
      return !registry.includes(`'./${file}'`) || registry.split(new RegExp(`\\b${name}\\b`)).length < 3;
    });
    expect(missing.map(({ path }) => `${path}: not in registry.ts`)).toEqual([]);
  });
});

describe('departures from a standard', () => {
  const departures = core.flatMap(({ path, text }) =>
    [...comment(text).matchAll(/Departs: ([\s\S]*?)(?=\n\s*\n|\n[A-Z]\w+: |\n(?:import|export|const|type)\b|$)/g)]
      .map(([, said = '']) => said.replaceAll(/\s+/g, ' ').trim())
      .filter((said) => !/^none\b/.test(said))
      .map((said) => ({ path, said })),
  );
  it('are all listed in DEVELOPERS.md, word for word', () => {
    expect(core.some(({ text }) => text.includes('Departs:'))).toBe(true);
    const listed = readFileSync(join(root, 'DEVELOPERS.md'), 'utf8').replaceAll(/\s+/g, ' ');
    const missing = departures.filter(({ said }) => !listed.includes(said));
    expect(missing.map(({ path, said }) => `${path}: "${said}" is not in DEVELOPERS.md`)).toEqual([]);
  });
});

describe('vectors', () => {
  const vectors = read('tests/vectors', /\.json$/).filter(({ path }) => !/known-misses|\/generate\//.test(path));
  const subjects = tests.filter(({ path }) => /^tests\/vectors(\.test\.ts|\/.*\.ts)$/.test(path));

  it('are at least eight files', () => expect(vectors.length).toBeGreaterThanOrEqual(8));

  it('say where they come from and what they mean, and are used', () => {
    const faults = vectors.flatMap(({ path, text }) => {
      const { subject, source: from, origin, about, tolerance, cases } = JSON.parse(text) as Record<string, unknown>;
      const key = new RegExp(`'${String(subject)}'|\\b${String(subject)}\\s*[:,}]`);
      const used = subjects.some((file) => key.test(file.text));
      return [
        ...(typeof from === 'string' && from !== '' ? [] : [`${path}: no source`]),
        ...(['published', 'independent', 'unseen', 'copied'].includes(String(origin))
          ? []
          : [`${path}: origin ${String(origin)}`]),
        ...(about && tolerance ? [] : [`${path}: no column meanings or no tolerances`]),
        ...(Array.isArray(cases) && cases.length > 0 ? [] : [`${path}: no cases`]),
        ...(used ? [] : [`${path}: no test runs the subject ${String(subject)}`]),
      ];
    });
    expect(faults).toEqual([]);
  });
});

describe('files are small and alike', () => {
  const lines = ({ text }: Text): number => text.split('\n').length - 1;
  const share = (sorted: readonly number[], part: number): number =>
    sorted[Math.floor((sorted.length - 1) * part)] ?? 0;
  it.each([
    { room: 'core', files: formulas, median: 120, ninth: 300, most: 400 },
    {
      room: 'views',
      files: source.filter(({ path }) => path.startsWith('src/views/')),
      median: 90,
      ninth: 250,
      most: 250,
    },
  ])('in $room', ({ files, median, ninth, most }) => {
    expect(files.length).toBeGreaterThan(5);
    const measured = files.filter(({ path }) => !path.endsWith('.table.ts'));
    const sorted = measured.map(lines).sort((one, other) => one - other);
    expect(measured.filter((file) => lines(file) > most).map((file) => `${file.path}: ${lines(file)} lines`)).toEqual(
      [],
    );
    expect(share(sorted, 0.5)).toBeLessThanOrEqual(median);
    expect(share(sorted, 0.9)).toBeLessThanOrEqual(ninth);
  });
});

describe('functions are short', () => {
  const MOST = 40;
  const KINDS = ['FunctionDeclaration', 'FunctionExpression', 'ArrowFunctionExpression'];
  interface Node {
    readonly type?: string;
    readonly start: number;
    readonly end: number;
    readonly body?: Node;
  }
  const isCode = (line: string): boolean => !/^\s*($|\/\/|\/\*|\*)/.test(line);

  /** Functions whose body has more lines of code than it may. The linter does not count those of markup. */
  function tooLong({ path, text }: Text): string[] {
    const found: string[] = [];
    const visit = (node: Node | readonly Node[] | null): void => {
      if (typeof node !== 'object' || node === null) return;
      if ('type' in node && KINDS.includes(node.type ?? '') && node.body) {
        const block = node.body.type === 'BlockStatement' ? 2 : 0; // its braces
        const lines = text.slice(node.body.start, node.body.end).split('\n').filter(isCode).length - block;
        const at = text.slice(0, node.start).split('\n').length;
        if (lines > MOST) found.push(`${path}:${at}: a function of ${lines} lines`);
      }
      Object.values(node).forEach(visit);
    };
    const { program, errors } = parseSync(path, text);
    if (errors.length > 0) throw new Error(`${path}: expected a program, got ${errors[0]?.message}`);
    visit(program as unknown as Node);
    return found;
  }

  const lines = (line: string): string => `${line}\n`.repeat(MOST + 1);
  it.each([
    ['a function', `function f() {\n${lines('g();')}}`],
    ['an arrow function', `const f = () => {\n${lines('g();')}};`],
    ['an arrow function without a block', `const f = () => [\n${lines('1,')}];`],
    ['a method', `const a = { f() {\n${lines('g();')}} };`],
    ['a component', `const F = () => {\nreturn (<ul>\n${lines('<li />')}</ul>);\n};`],
  ])('%s', (_kind, text) => {
    expect(tooLong({ path: 'a.tsx', text })).toHaveLength(1);
    expect(tooLong({ path: 'a.tsx', text: text.replace(/(.+\n)\1{3}/, '// said\n\n') })).toEqual([]);
  });

  it('everywhere', () => expect(source.flatMap(tooLong)).toEqual([]));
});

describe('the top of the project', () => {
  it('holds only what it must', () => {
    const allowed = [
      'README.md',
      'DEVELOPERS.md',
      'LICENSE',
      'package.json',
      'package-lock.json',
      'tsconfig.json',
      'vite.config.ts',
      'index.html',
      'src',
      'public',
      'tests',
    ];
    const made = ['node_modules', 'dist', 'coverage'];
    const others = readdirSync(root).filter((name) => !name.startsWith('.') && ![...allowed, ...made].includes(name));
    expect(others).toEqual([]);
  });
  it('locks versions, not addresses', () => {
    expect(readFileSync(join(root, 'package-lock.json'), 'utf8')).not.toContain('"resolved"');
    const { dependencies, devDependencies } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));
    const loose = Object.entries({ ...dependencies, ...devDependencies }).filter(
      ([, pin]) => !/^\d+\.\d+\.\d+$/.test(String(pin)),
    );
    expect(loose).toEqual([]);
  });
});
