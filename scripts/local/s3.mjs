import { mkdirSync } from 'node:fs';
import S3rver from 's3rver';

/** Stand-in for S3 on one machine. Usage: node s3.mjs <folder> <port> <bucket> */
const [folder, port, bucket] = process.argv.slice(2);

/** Browsers upload straight to the bucket, from whatever port the app is on. */
const CORS = `<CORSConfiguration><CORSRule>
  <AllowedOrigin>http://127.0.0.1:*</AllowedOrigin>
  <AllowedMethod>GET</AllowedMethod><AllowedMethod>PUT</AllowedMethod><AllowedMethod>POST</AllowedMethod><AllowedMethod>HEAD</AllowedMethod>
  <AllowedHeader>*</AllowedHeader><ExposeHeader>ETag</ExposeHeader>
</CORSRule></CORSConfiguration>`;

mkdirSync(folder, { recursive: true });
await new S3rver({
  address: '127.0.0.1',
  port: Number(port),
  directory: folder,
  silent: true,
  configureBuckets: [{ name: bucket, configs: [CORS] }],
}).run();
