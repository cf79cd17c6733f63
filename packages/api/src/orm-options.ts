import { Migrator } from '@mikro-orm/migrations';
import { defineConfig, type EntitySchema } from '@mikro-orm/sqlite';
import { AuditEntry } from './audit/audit-entry.entity.js';
import { Session } from './auth/session.entity.js';
import { WelcomeLink } from './auth/welcome-link.entity.js';
import { DesignSet } from './design-sets/design-set.entity.js';
import { Option } from './design-sets/option.entity.js';
import { migrations } from './migrations/migrations.js';
import { Person } from './people/person.entity.js';
import { CostPlan } from './studies/cost-plan.entity.js';
import { Limits } from './studies/limits.entity.js';
import { Membership } from './studies/membership.entity.js';
import { PlanningValue } from './studies/planning-value.entity.js';
import { PlanningValueRevision } from './studies/planning-value-revision.entity.js';
import { Study } from './studies/study.entity.js';

/** Each after those it refers to. */
export const entities: EntitySchema[] = [
  Person,
  Session,
  WelcomeLink,
  Study,
  Membership,
  PlanningValue,
  PlanningValueRevision,
  CostPlan,
  Limits,
  DesignSet,
  Option,
  AuditEntry,
];

const pragmas = [
  'pragma journal_mode = WAL',
  'pragma synchronous = FULL',
  'pragma foreign_keys = ON',
  'pragma busy_timeout = 5000',
].join(';');

interface SqliteConnection {
  exec(sql: string, done: (error: Error | null) => void): void;
}

export const ormOptions = (database: string) =>
  defineConfig({
    dbName: database,
    entities,
    extensions: [Migrator],
    migrations: { migrationsList: migrations, snapshot: false, silent: true },
    pool: {
      min: 1,
      max: 1,
      afterCreate: (connection: SqliteConnection, done: (error: Error | null) => void) =>
        connection.exec(pragmas, done),
    },
  });
