import type { Request } from 'express';
import { importDraftSchema, type ImportDraft } from '../../shared/patterns/imports.schema.ts';
import type { FileStore } from '../files/file-store.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import { parseId } from '../http/parse.ts';
import { found, notFound } from '../http/problem.ts';
import { findDraft, type KeptDraft } from './imports.store.ts';
import { canUsePattern } from './patterns.policy.ts';
import { readDraft } from './read-draft.ts';

const THING = 'import';

interface OwnDrafts {
  /** The draft in the address; 401 and 404 as everywhere. */
  own: (request: Request) => Promise<KeptDraft>;
  /** A draft as it may leave, read anew. */
  read: (id: string) => Promise<ImportDraft>;
}

/** Whose a draft is and how it reads now: what each of its routes begins and ends with. */
export function ownDrafts({ db, files, requireUser }: RouteDeps & { files: FileStore }): OwnDrafts {
  return {
    async own(request) {
      const user = await requireUser(request);
      const draft = found(await findDraft(db, parseId(request, THING)), THING);
      if (!canUsePattern(user, draft)) throw notFound(THING);
      return draft;
    },
    async read(id) {
      const draft = found(await findDraft(db, id), THING);
      return answer(importDraftSchema, await readDraft(files, draft));
    },
  };
}
