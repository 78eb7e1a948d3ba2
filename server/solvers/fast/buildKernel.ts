import { writeFileSync } from 'node:fs';
import path from 'node:path';

import { compileKernel } from './compileKernel';

writeFileSync(path.join(__dirname, 'kernelBytes.ts'), compileKernel());
