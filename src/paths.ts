/** Every address in the browser, in one place. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  signUp: '/sign-up',
  people: '/people',
  newPerson: '/people/new',
  person: (personId: string) => `/people/${personId}`,
  editPerson: (personId: string) => `/people/${personId}/edit`,
  measure: (personId: string) => `/people/${personId}/measure`,
  measurementSet: (personId: string, setId: string) => `/people/${personId}/sets/${setId}`,
  patterns: '/patterns',
  pattern: (patternId: string) => `/patterns/${patternId}`,
  editPattern: (patternId: string) => `/patterns/${patternId}/edit`,
  revision: (patternId: string, revisionId: string) => `/patterns/${patternId}/revisions/${revisionId}`,
  import: (draftId: string) => `/imports/${draftId}`,
  newImport: '/imports/new',
  /** The fit view: `?set=…&revision=…` and options, all in the address. */
  fit: '/fit',
  plans: '/plans',
  plan: (planId: string) => `/plans/${planId}`,
} as const;
