import { connect } from '@/db/connect';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { seedDemo } from './demo/seed';
import { whyNotSeed } from './local-only';

const url = process.env.DATABASE_OWNER_URL;
const refusal = url ? whyNotSeed(url, process.env.CARRYOVER_ENV) : 'DATABASE_OWNER_URL is not set.';
if (!url || refusal) {
  console.error(refusal);
  process.exit(1);
}

const DAY_MS = 86_400_000;
const today = new Date(Math.floor(Date.now() / DAY_MS) * DAY_MS);

const { db, close } = connect(url, { max: 1 });
try {
  // All of it or nothing: a killed seeding leaves the database empty, and the next start seeds it.
  await db.transaction((tx) => seedDemo(tx, { today, rulebook: defaultRulebook }));
} finally {
  await close();
}
