/** As much of the stand-in as tests use; the package has no types of its own. */
declare module 's3rver' {
  export default class S3rver {
    constructor(options: { address: string; port: number; directory: string; silent: boolean; configureBuckets: { name: string; configs: string[] }[] });
    run(): Promise<{ address: string; port: number }>;
    close(): Promise<void>;
  }
}
