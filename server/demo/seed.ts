import type { Logger } from 'pino';
import { demoDress } from '../../shared/demo/demo-dress.ts';
import { demoPeople } from '../../shared/demo/demo-people.ts';
import type { DemoPattern, DemoPerson } from '../../shared/demo/demo-shapes.ts';
import { demoCape, demoShirt } from '../../shared/demo/demo-shirt-and-cape.ts';
import { demoTable } from '../../shared/demo/demo-table.ts';
import { demoTrousers } from '../../shared/demo/demo-trousers.ts';
import { demoAstmTable, demoJisTable } from '../../shared/demo/published-tables.ts';
import { PAGE_SIZE_MAX } from '../../shared/paging.ts';
import { TABLE_ROLES } from '../../shared/patterns/imports.schema.ts';
import { readMeasurements } from '../../shared/people/read-measurements.ts';
import { makePlan } from '../../shared/plans/make-plan.ts';
import type { Auth } from '../auth.ts';
import type { Db } from '../db/client.ts';
import type { FileStore } from '../files/file-store.ts';
import { loadPlanGround } from '../fit/fit.store.ts';
import { found } from '../http/problem.ts';
import { commitImport } from '../patterns/commit-import.ts';
import { createDraft, findDraft } from '../patterns/imports.store.ts';
import { keepTable } from '../patterns/keep-table.ts';
import { listPatterns } from '../patterns/patterns.store.ts';
import { writeCsv } from '../patterns/reading/write-csv.ts';
import { createMeasurementSet } from '../people/measurement-sets.store.ts';
import { createPerson, listPeople } from '../people/people.store.ts';
import { createPlan, listPlans } from '../plans/plans.store.ts';
import { demoAccount } from './demo-accounts.ts';
import type { DemoSignIn } from './kept-sign-ins.ts';

export interface SeedDeps {
  db: Db;
  auth: Auth;
  files: FileStore;
  log: Logger;
}

const EVERYTHING = { page: 1, pageSize: PAGE_SIZE_MAX, q: '' };
const PATTERNS = [demoDress, demoTrousers, demoShirt, demoCape, demoAstmTable, demoJisTable];
const PLANS = [
  { name: 'Tilde, Sluice dress, for the spring', person: 'Tilde', pattern: 'Sluice dress' },
  { name: 'Ruben, Lockkeeper shirt', person: 'Ruben', pattern: 'Lockkeeper shirt' },
];

/**
 * Makes the demo's accounts and, for the member, the people, patterns and plans; answers how to sign in. Patterns go
 * through the same import as an uploaded file. What a start that was cut short has left is kept and completed.
 */
export async function seedDemo(deps: SeedDeps): Promise<DemoSignIn[]> {
  const member = await demoAccount(deps.auth, 'Tilde', 'member');
  const teacher = await demoAccount(deps.auth, 'Oriel', 'teacher');
  const admin = await demoAccount(deps.auth, 'Sefa', 'admin');
  const people = (await listPeople(deps.db, member.id, EVERYTHING)).people.map(({ name }) => name);
  for (const person of demoPeople) {
    if (!people.includes(person.details.name)) await seedPerson(deps, member.id, person);
  }
  const { patterns } = await listPatterns(deps.db, member.id, EVERYTHING);
  const titles = patterns.map(({ title }) => title);
  for (const pattern of PATTERNS) {
    if (!titles.includes(pattern.details.title)) await seedPattern(deps, member.id, pattern);
  }
  await seedPlans(deps, member.id);
  return [member.signIn, teacher.signIn, admin.signIn];
}

async function seedPerson({ db }: SeedDeps, ownerId: string, { details, sets }: DemoPerson): Promise<void> {
  await db.transaction(async (tx) => {
    const personId = await createPerson(tx, ownerId, details);
    let startedFromId: string | null = null;
    for (const { typed, ...set } of sets) {
      const { values } = readMeasurements(typed, details.unit);
      const made = await createMeasurementSet(tx, {
        ...set,
        unit: details.unit,
        startedFromId,
        personId,
        values,
      });
      startedFromId = made.id;
    }
  });
}

async function seedPattern(deps: SeedDeps, ownerId: string, pattern: DemoPattern): Promise<void> {
  const { db, files } = deps;
  const draftId = await createDraft(db, ownerId, { patternId: null, details: pattern.details });
  const table = demoTable(pattern);
  for (const role of TABLE_ROLES) {
    if (table[role].length === 0) continue;
    const draft = found(await findDraft(db, draftId), 'import');
    const name = `${pattern.details.title} ${role}.csv`;
    await keepTable(deps, draft, role, {
      name,
      content: Buffer.from(writeCsv(table, role)),
      mediaType: 'text/csv',
    });
  }
  await commitImport(db, files, draftId);
}

async function seedPlans({ db }: SeedDeps, ownerId: string): Promise<void> {
  const there = (await listPlans(db, ownerId, EVERYTHING)).plans.map(({ name }) => name);
  const { people } = await listPeople(db, ownerId, EVERYTHING);
  const { patterns } = await listPatterns(db, ownerId, EVERYTHING);
  for (const plan of PLANS) {
    const measurementSetId = people.find(({ name }) => name === plan.person)?.latestSetId;
    const revisionId = patterns.find(({ title }) => title === plan.pattern)?.latestRevisionId;
    if (there.includes(plan.name) || !measurementSetId || !revisionId) continue;
    const asked = { name: plan.name, measurementSetId, revisionId, options: {} };
    await createPlan(db, ownerId, asked, makePlan(await loadPlanGround(db, ownerId, asked)));
  }
}
