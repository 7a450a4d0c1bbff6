// Each check and each suite of `npm test`: what runs it, and how its result is counted. Needs node_modules.
import { cpSync, existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { runTied } from './tied.mjs';

const tool =
  (path, ...args) =>
  ({ root }) =>
    runTied(process.execPath, [join(root, 'node_modules', path), ...args]);

/** Longest first: two run at a time. */
export const CHECKS = [
  ['lint', tool('eslint/bin/eslint.js', '.', '--max-warnings', '0')],
  ['types', tool('typescript/bin/tsc', '--noEmit')],
  ['format', tool('prettier/bin/prettier.cjs', '--check', '--log-level', 'warn', '.')],
  ['schema drift', schemaDrift],
  [
    'layers',
    tool(
      'dependency-cruiser/bin/dependency-cruise.mjs',
      '--config',
      '.dependency-cruiser.cjs',
      '--',
      'src',
      'server',
      'shared',
      'tests',
    ),
  ],
  ['dead code', tool('knip/bin/knip.js', '--no-progress', '--treat-config-hints-as-errors')],
];

export const SUITES = ['unit', 'published', 'api', 'e2e'];

/** Runs one check: one passed or one failed. */
export async function runCheck([name, run], context) {
  const began = performance.now();
  const { code, output } = await run(context);
  return {
    name,
    ms: performance.now() - began,
    passed: code === 0 ? 1 : 0,
    failed: code === 0 ? 0 : 1,
    output: code === 0 ? '' : output,
  };
}

/** Runs one suite of tests. A suite without a test, a file that cannot be read and a skipped test are failures. */
export async function runSuite(suite, { root, environment }) {
  const began = performance.now();
  const report = join(root, '.test', `${suite}.json`);
  rmSync(report, { force: true });
  const { code, output } = await runTied(
    process.execPath,
    [
      join(root, 'node_modules/vitest/vitest.mjs'),
      ...['run', '--project', suite, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`],
    ],
    { env: { ...process.env, ...environment, NO_COLOR: '1' } },
  );
  const { passed, failed, notes } = countTests(report);
  const isClean = code === 0 && failed === 0;
  return {
    name: suite,
    ms: performance.now() - began,
    passed,
    failed: isClean ? 0 : Math.max(failed, 1),
    output: isClean ? '' : [output, ...notes].join('\n'),
  };
}

function countTests(report) {
  if (!existsSync(report)) return { passed: 0, failed: 1, notes: ['The tests did not run to their end.'] };
  const { testResults } = JSON.parse(readFileSync(report, 'utf8'));
  const tests = testResults.flatMap((file) => file.assertionResults);
  const passed = tests.filter(({ status }) => status === 'passed').length;
  const unread = testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.every(isPassed),
  );
  const skipped = tests.filter(({ status }) => status !== 'passed' && status !== 'failed');
  const notes = skipped.map(({ fullName, status }) => `Not run (${status}): ${fullName}`);
  if (tests.length === 0) notes.push('There is no test in this suite.');
  const failed = tests.length - passed + unread.length + (tests.length === 0 ? 1 : 0);
  return { passed, failed, notes };
}

const isPassed = ({ status }) => status === 'passed';

/** The generator works on a copy: tables without their migration must not be mended silently by the check. */
async function schemaDrift({ root }) {
  const folder = mkdtempSync(join(root, '.test/drift-'));
  try {
    const out = join(folder, 'drizzle');
    cpSync(join(root, 'drizzle'), out, { recursive: true });
    const result = await runTied(process.execPath, [
      join(root, 'node_modules/drizzle-kit/bin.cjs'),
      ...[
        'generate',
        '--dialect',
        'mysql',
        '--schema',
        './server/db/schema.ts',
        '--out',
        out.slice(root.length + 1),
      ],
    ]);
    // It answers 0 also where it could not ask whether a column was renamed.
    const isSame = result.code === 0 && /No schema changes/.test(result.output);
    return { ...result, code: isSame ? 0 : 1 };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
