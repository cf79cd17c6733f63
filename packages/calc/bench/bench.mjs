import { appraisals } from './appraisals.mjs';
import { bundleSize } from './bundle-size.mjs';
import { dunnett } from './dunnett.mjs';
import { twoSample } from './two-sample.mjs';
import { weighing } from './weighing.mjs';

twoSample();
dunnett();
appraisals();
weighing();
await bundleSize();
