import { env } from '@/lib/env';
import { connect } from '../client';
import { seedMaterials } from './materials';

const db = connect(env().DATABASE_PATH);
seedMaterials(db);
db.$client.close();
console.log(`${env().DATABASE_PATH} is seeded`);
