/** Every address in the browser, in one place. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  signUp: '/sign-up',
  /** The four below are linked to from mails. */
  forgottenPassword: '/forgotten-password',
  newPassword: '/new-password',
  confirmAddress: '/confirm-address',
  account: '/account',
  people: '/people',
  newPerson: '/people/new',
  person: (personId: string) => `/people/${personId}`,
  editPerson: (personId: string) => `/people/${personId}/edit`,
  measure: (personId: string) => `/people/${personId}/measure`,
  measurementSet: (personId: string, setId: string) => `/people/${personId}/sets/${setId}`,
  patterns: '/patterns',
  pattern: (patternId: string) => `/patterns/${patternId}`,
  newPattern: '/patterns/new',
  editPattern: (patternId: string) => `/patterns/${patternId}/edit`,
  editTable: (patternId: string) => `/patterns/${patternId}/table`,
  /** `?from=…&to=…`: the ids of two revisions. */
  compareRevisions: (patternId: string) => `/patterns/${patternId}/compare`,
  revision: (patternId: string, revisionId: string) => `/patterns/${patternId}/revisions/${revisionId}`,
  import: (draftId: string) => `/imports/${draftId}`,
  newImport: '/imports/new',
  /** The fit view: `?set=…&revision=…` and options, all in the address. */
  fit: '/fit',
  plans: '/plans',
  plan: (planId: string) => `/plans/${planId}`,
  adminPeople: '/admin/people',
  adminRequests: '/admin/requests',
  adminMail: '/admin/mail',
  adminLog: '/admin/log',
  adminHealth: '/admin/health',
  adminReference: '/admin/reference',
  /** Only where nobody but this machine reaches the instance. */
  mailbox: '/mailbox',
  mailboxMessage: (mailId: string) => `/mailbox/${mailId}`,
  /** What scripts may ask of Leeway, from its own description. */
  interface: '/interface',
} as const;
