import { ormOptions } from './orm-options.js';
import { readSettings } from './settings/settings.js';

/** For MikroORM's command line, which looks for a default export. */
export default ormOptions(readSettings(process.env).database);
