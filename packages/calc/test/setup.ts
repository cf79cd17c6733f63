import process from 'node:process';
import fc from 'fast-check';

// Where CI is set, a run can be repeated; elsewhere each run tries other requests.
if (process.env.CI) fc.configureGlobal({ seed: 20_251_201 });
