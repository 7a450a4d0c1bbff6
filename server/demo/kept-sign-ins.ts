import { readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { z } from 'zod';
import { ROLES } from '../../shared/me.ts';

const signInsSchema = z.array(
  z.object({ name: z.string(), email: z.email(), password: z.string(), role: z.enum(ROLES) }),
);
/** One of the demo's accounts. */
export type DemoSignIn = z.infer<typeof signInsSchema>[number];

/**
 * The demo's accounts: seeded once, then read from the data folder, where only its owner can read them. Seeded
 * anew where the database no longer knows them (`isKnown`).
 */
export async function keptSignIns(
  dataFolder: string,
  isKnown: (signIn: DemoSignIn) => Promise<boolean>,
  seed: () => Promise<DemoSignIn[]>,
): Promise<DemoSignIn[]> {
  const path = join(dataFolder, 'demo-sign-ins.json');
  const kept = read(path);
  if (kept?.[0] && (await isKnown(kept[0]))) return kept;
  const made = await seed();
  // Renamed into place: a start that is cut short leaves no half a file.
  writeFileSync(`${path}.new`, `${JSON.stringify(made, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${path}.new`, path);
  return made;
}

function read(path: string): DemoSignIn[] | null {
  try {
    return signInsSchema.parse(JSON.parse(readFileSync(path, 'utf8')));
  } catch {
    return null;
  }
}
