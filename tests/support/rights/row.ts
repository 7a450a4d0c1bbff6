import type { SignedIn, TestApp } from '../app.ts';

/** Who asks. The owner is a member; the tokens are the owner's, allowed everything but what is needed, or only that. */
export const ASKERS = ['nobody', 'owner', 'other', 'teacher', 'admin', 'wrongScope', 'rightScope'] as const;
export type Asker = (typeof ASKERS)[number];

/** The status that each is answered with. */
export type Rights = Record<Asker, number>;

/** How a route is asked: the parts of its address, and what is sent. */
export interface Asked {
  address?: Record<string, string>;
  query?: Record<string, string>;
  body?: object;
  /** An uploaded file's text, in the field `file`. */
  file?: string;
}

export interface Ground {
  test: TestApp;
  /** Whose records are asked for. */
  owner: SignedIn;
  /** Who asks; the owner where nobody is signed in, or a token asks. */
  asker: SignedIn;
}

/** One route's row in the matrix. */
export interface Row {
  rights: Rights;
  /** Makes what the route works on anew for each who asks, and says how it is asked. */
  ask?: (ground: Ground) => Promise<Asked> | Asked;
  /** The route ends or changes the asker's own account or session: each asker is somebody new. */
  endsAsker?: boolean;
}

export type Rows = Record<string, Row>;

/** The owner's own: to everybody else it does not exist, whatever their role. */
export const ownRecord = (done: number): Rights => ({
  nobody: 401,
  owner: done,
  other: 404,
  teacher: 404,
  admin: 404,
  wrongScope: 403,
  rightScope: done,
});

/** Everybody who is signed in, each with their own. */
export const eachTheirOwn = (done: number): Rights => ({
  ...ownRecord(done),
  other: done,
  teacher: done,
  admin: done,
});

/** The same, from a signed-in browser only: no token is allowed it. */
export const bySession = (rights: Rights): Rights => ({ ...rights, wrongScope: 403, rightScope: 403 });

/** The administrators', from a signed-in browser only. */
export const administrators = (done: number): Rights => ({
  nobody: 401,
  owner: 403,
  other: 403,
  teacher: 403,
  admin: done,
  wrongScope: 403,
  rightScope: 403,
});

/** Everybody, signed in or not, by token or not. */
export const everybody = (done: number): Rights => ({
  nobody: done,
  owner: done,
  other: done,
  teacher: done,
  admin: done,
  wrongScope: done,
  rightScope: done,
});

/** Everybody from our own pages: a token comes without their Origin. */
export const ownPages = (rights: Rights): Rights => ({ ...rights, wrongScope: 403, rightScope: 403 });

/** Makes something of the owner's, and asks without saying which. */
export const having =
  (make: (ground: Ground) => Promise<unknown>) =>
  async (ground: Ground): Promise<Asked> => {
    await make(ground);
    return {};
  };
