import { writeFileSync } from 'node:fs';
import { verify } from './verification';

const target = new URL('../../../public/verification/finite-elements.json', import.meta.url);
writeFileSync(target, `${JSON.stringify(verify(), null, 2)}\n`);
