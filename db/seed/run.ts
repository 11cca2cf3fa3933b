import { env, wantsDemo } from '@/lib/env';
import { connect } from '../client';
import { seedDemoLibrary } from './demo-library';
import { seedDemoMembers } from './demo-members';
import { seedMaterials } from './materials';

const db = connect(env().DATABASE_PATH);
seedMaterials(db);
if (wantsDemo() && (await seedDemoMembers(db))) await seedDemoLibrary(db);
db.$client.close();
console.log(`${env().DATABASE_PATH} is seeded`);
