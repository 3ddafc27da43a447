import { connect } from '@/db/connect';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { whyNotSeed } from './local-only';
import { seedMinimal } from './minimal';

const url = process.env.DATABASE_OWNER_URL;
const refusal = url ? whyNotSeed(url, process.env.CARRYOVER_ENV) : 'DATABASE_OWNER_URL is not set.';
if (!url || refusal) {
  console.error(refusal);
  process.exit(1);
}

const { db, close } = connect(url, { max: 1 });
try {
  // All of it or nothing: a killed seeding leaves the database empty, and the next start seeds it.
  await db.transaction(async (tx) => {
    await seedMinimal(tx, defaultRulebook);
  });
} finally {
  await close();
}
