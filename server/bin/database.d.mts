/** A running private MariaDB. */
export interface PrivateDatabase {
  url: string;
  port: number;
  pid: number;
  ended: Promise<unknown>;
  stop: () => Promise<void>;
}

export function startDatabase(folder: string, options?: { isThrowaway?: boolean }): Promise<PrivateDatabase>;
