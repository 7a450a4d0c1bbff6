/** What the bench uses of it; the package brings no types. */
declare module 'autocannon' {
  interface Options {
    url: string;
    method: 'POST';
    headers: Record<string, string>;
    body: string;
    connections: number;
    duration?: number;
    amount?: number;
  }
  interface Result {
    requests: { average: number; total: number };
    non2xx: number;
    errors: number;
  }
  export default function autocannon(options: Options): Promise<Result>;
}
