import { MikroOrmModule } from '@mikro-orm/nestjs';
import { SqliteDriver } from '@mikro-orm/sqlite';
import { Module } from '@nestjs/common';
import { ConfigModule } from '@nestjs/config';
import { APP_FILTER, APP_GUARD, APP_INTERCEPTOR, APP_PIPE } from '@nestjs/core';
import { CqrsModule } from '@nestjs/cqrs';
import { ZodSerializerInterceptor } from 'nestjs-zod';
import { AppraisalsModule } from './appraisals/appraisals.module.js';
import { AuditModule } from './audit/audit.module.js';
import { AuthModule } from './auth/auth.module.js';
import { AuthGuard } from './common/auth.guard.js';
import { CommonModule } from './common/common.module.js';
import { OriginGuard } from './common/origin.guard.js';
import { ProblemFilter } from './common/problem.filter.js';
import { BodyValidationPipe } from './common/validation.js';
import { DemoModule } from './demo/demo.module.js';
import { DesignSetsModule } from './design-sets/design-sets.module.js';
import { HealthModule } from './health/health.module.js';
import { ormOptions } from './orm-options.js';
import { PeopleModule } from './people/people.module.js';
import { appSettings, type Settings } from './settings/settings.js';
import { StudiesModule } from './studies/studies.module.js';

@Module({
  imports: [
    ConfigModule.forRoot({ isGlobal: true, ignoreEnvFile: true, load: [appSettings] }),
    MikroOrmModule.forRootAsync({
      driver: SqliteDriver,
      inject: [appSettings.KEY],
      useFactory: ({ database }: Settings) => ({ ...ormOptions(database), registerRequestContext: false }),
    }),
    CqrsModule.forRoot(),
    CommonModule,
    AuthModule,
    PeopleModule,
    AuditModule,
    StudiesModule,
    DesignSetsModule,
    AppraisalsModule,
    HealthModule,
    DemoModule,
  ],
  providers: [
    { provide: APP_GUARD, useClass: OriginGuard },
    { provide: APP_GUARD, useClass: AuthGuard },
    { provide: APP_PIPE, useClass: BodyValidationPipe },
    { provide: APP_INTERCEPTOR, useClass: ZodSerializerInterceptor },
    { provide: APP_FILTER, useClass: ProblemFilter },
  ],
})
export class AppModule {}
