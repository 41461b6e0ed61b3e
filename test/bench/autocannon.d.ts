declare module "autocannon" {
  /** The part of its result that the benchmark reads. */
  interface Result {
    readonly "2xx": number;
    readonly non2xx: number;
    readonly errors: number;
  }
  export default function autocannon(options: {
    readonly url: string;
    readonly method: string;
    readonly headers: Readonly<Record<string, string>>;
    readonly body: string;
    readonly connections: number;
    /** Requests in one run. */
    readonly amount: number;
    readonly sampleInt: number;
  }): Promise<Result>;
}
