import { config } from 'zod/mini';

// Schemas would try whether they may compile themselves, which the page's security policy forbids and reports.
// Each asks once, when it is made: so this file is imported before all others.
config({ jitless: true });
