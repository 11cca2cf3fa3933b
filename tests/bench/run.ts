// Every bench of the project, one after the other. Times are of the machine at hand; ratios travel.
import './fea';
import { run as browser } from './browser.bench';
import { run as geometry } from './geometry.bench';

for (const bench of [geometry, browser]) await bench();
