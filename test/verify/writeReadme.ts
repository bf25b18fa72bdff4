import { writeFileSync } from 'node:fs';
import { README, readmeTexts } from './readmeTable';

writeFileSync(README, readmeTexts().due);
