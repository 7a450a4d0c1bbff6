import type { Auth } from '../auth.ts';
import type { Config } from '../config.ts';
import type { RouteDeps } from '../http/deps.ts';
import type { AccountLimits } from './limits.ts';

/** What the routes of an account are given beside what every route is. */
export interface AuthRouteDeps extends RouteDeps {
  auth: Auth;
  limits: AccountLimits;
  config: Pick<Config, 'appUrl' | 'mailFrom'>;
}
