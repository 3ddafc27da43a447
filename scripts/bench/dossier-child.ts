/** Makes the PDF of one dossier as the worker does, and prints the most memory that this process ever took, in KiB. */
import { connect } from '@/db/connect';
import { makeDossierPdf } from '@/lib/services/dossier/make-pdf';
import { createStorage } from '@/lib/storage';

const [organisationId = '', dossierId = ''] = process.argv.slice(2);
const { DATABASE_URL = '', S3_ENDPOINT = '', S3_BUCKET = '', S3_ACCESS_KEY = '', S3_SECRET_KEY = '' } = process.env;
const { db, close } = connect(DATABASE_URL, { max: 2 });
const storage = createStorage({ endpoint: S3_ENDPOINT, region: 'us-east-1', bucket: S3_BUCKET, accessKey: S3_ACCESS_KEY, secretKey: S3_SECRET_KEY });
await makeDossierPdf({ db, storage, now: () => new Date() }, { organisationId, dossierId }, { isLast: true });
await close();
console.log(process.resourceUsage().maxRSS);
