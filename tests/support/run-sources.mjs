/** Preloaded into a thread that runs the TypeScript sources as they are, as the tests' threads do. */
import { register } from 'tsx/esm/api';

register();
