/** The parts of s3rver 3.7.1 that are used here; the package ships no types. */
declare module 's3rver' {
  import type { AddressInfo } from 'node:net';
  import type { Server } from 'node:http';

  interface Options {
    address: string;
    port: number;
    silent: boolean;
    directory: string;
    vhostBuckets: boolean;
    configureBuckets: { name: string }[];
  }

  interface Context {
    headers: Record<string, string | undefined>;
    status: number;
  }

  export default class S3rver {
    constructor(options: Partial<Options>);
    middleware: ((context: Context, next: () => Promise<void>) => Promise<void>)[];
    httpServer: Server;
    run(): Promise<AddressInfo>;
    close(): Promise<void>;
  }
}

declare module 's3rver/lib/models/account.js' {
  const account: { DUMMY_ACCOUNT: { createKeyPair(accessKey: string, secretKey: string): void } };
  export default account;
}
