import { Migration } from '@mikro-orm/migrations';

/** What teams decide and who did what: audit, revisions, limits, rulings, removals, choices, one-time links. */
export class Decisions extends Migration {
  override up(): void {
    this.addSql('alter table study add column basis json null');
    this.addSql('alter table study add column estimand json null');

    this.addSql(`
      create table planning_value_revision (
        id integer not null primary key autoincrement,
        planning_value_id text not null references planning_value (id) on delete cascade on update cascade,
        version integer not null,
        value real not null,
        low real null,
        high real null,
        source text not null,
        set_by_id text not null references person (id) on update cascade,
        set_at datetime not null
      )`);
    this.addSql(
      'create index planning_value_revision_planning_value_id_index on planning_value_revision (planning_value_id)',
    );
    this.addSql(
      'create index planning_value_revision_set_by_id_index on planning_value_revision (set_by_id)',
    );
    this.addSql(`
      insert into planning_value_revision (planning_value_id, version, value, low, high, source, set_by_id, set_at)
      select id, version, value, low, high, source, set_by_id, changed_at from planning_value`);

    this.addSql(`
      create table limits (
        id text not null primary key,
        version integer not null default 1,
        created_at datetime not null,
        changed_at datetime not null,
        study_id text not null references study (id) on update cascade,
        limits json not null
      )`);
    this.addSql('create unique index limits_study_id_unique on limits (study_id)');

    this.addSql('alter table cost_plan add column source text null');

    this.addSql('alter table design_set add column choice json null');
    this.addSql(
      'alter table design_set add column chosen_by_id text null references person (id) on delete set null on update cascade',
    );
    this.addSql('create index design_set_chosen_by_id_index on design_set (chosen_by_id)');

    this.addSql('alter table option add column ruling json null');
    this.addSql(
      'alter table option add column ruled_by_id text null references person (id) on delete set null on update cascade',
    );
    this.addSql('alter table option add column ruled_at datetime null');
    this.addSql('alter table option add column removed_at datetime null');
    this.addSql('create index option_ruled_by_id_index on option (ruled_by_id)');

    this.addSql(`
      create table audit_entry (
        id integer not null primary key autoincrement,
        at datetime not null,
        by_id text null references person (id) on delete set null on update cascade,
        study_id text null references study (id) on delete set null on update cascade,
        action text not null,
        what text not null,
        before json null,
        after json null
      )`);
    this.addSql('create index audit_entry_at_index on audit_entry (at)');
    this.addSql('create index audit_entry_by_id_index on audit_entry (by_id)');
    this.addSql('create index audit_entry_study_id_index on audit_entry (study_id)');

    this.addSql(`
      create table welcome_link (
        id text not null primary key,
        person_id text not null references person (id) on delete cascade on update cascade,
        created_at datetime not null,
        expires_at datetime not null
      )`);
    this.addSql('create unique index welcome_link_person_id_unique on welcome_link (person_id)');
  }
}
