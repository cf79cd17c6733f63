import { Migration } from '@mikro-orm/migrations';

/** People and their sessions, studies with their members, planning values and costs, design sets with their options. */
export class Foundation extends Migration {
  override up(): void {
    this.addSql(`
      create table person (
        id text not null primary key,
        version integer not null default 1,
        created_at datetime not null,
        changed_at datetime not null,
        name text not null,
        email text not null,
        password_hash text not null,
        administrator integer not null
      )`);
    this.addSql('create unique index person_email_unique on person (email)');

    this.addSql(`
      create table session (
        id text not null primary key,
        person_id text not null references person (id) on delete cascade on update cascade,
        created_at datetime not null,
        last_seen_at datetime not null,
        expires_at datetime not null
      )`);
    this.addSql('create index session_person_id_index on session (person_id)');
    this.addSql('create index session_expires_at_index on session (expires_at)');

    this.addSql(`
      create table study (
        id text not null primary key,
        version integer not null default 1,
        created_at datetime not null,
        changed_at datetime not null,
        name text not null,
        organisation text not null,
        fictional integer not null,
        question text not null,
        outcome_label text not null,
        outcome_unit text not null,
        plan json not null,
        treatments json not null,
        participants json not null,
        clusters json null
      )`);

    this.addSql(`
      create table membership (
        id text not null primary key,
        study_id text not null references study (id) on update cascade,
        person_id text not null references person (id) on update cascade,
        role text not null check (role in ('methodologist', 'investigator', 'funder', 'reader'))
      )`);
    this.addSql('create index membership_study_id_index on membership (study_id)');
    this.addSql('create index membership_person_id_index on membership (person_id)');
    this.addSql(
      'create unique index membership_study_id_person_id_unique on membership (study_id, person_id)',
    );

    this.addSql(`
      create table planning_value (
        id text not null primary key,
        version integer not null default 1,
        created_at datetime not null,
        changed_at datetime not null,
        study_id text not null references study (id) on update cascade,
        key text not null,
        scope text not null,
        value real not null,
        low real null,
        high real null,
        source text not null,
        set_by_id text not null references person (id) on update cascade
      )`);
    this.addSql('create index planning_value_study_id_index on planning_value (study_id)');
    this.addSql('create index planning_value_set_by_id_index on planning_value (set_by_id)');
    this.addSql(
      'create unique index planning_value_study_id_key_scope_unique on planning_value (study_id, key, scope)',
    );

    this.addSql(`
      create table cost_plan (
        id text not null primary key,
        version integer not null default 1,
        created_at datetime not null,
        changed_at datetime not null,
        study_id text not null references study (id) on update cascade,
        costs json not null,
        timeline json not null,
        set_by_id text not null references person (id) on update cascade
      )`);
    this.addSql('create unique index cost_plan_study_id_unique on cost_plan (study_id)');
    this.addSql('create index cost_plan_set_by_id_index on cost_plan (set_by_id)');

    this.addSql(`
      create table design_set (
        id text not null primary key,
        version integer not null default 1,
        created_at datetime not null,
        changed_at datetime not null,
        study_id text not null references study (id) on update cascade,
        hold json not null,
        option_ids json not null
      )`);
    this.addSql('create unique index design_set_study_id_unique on design_set (study_id)');

    this.addSql(`
      create table option (
        id text not null primary key,
        version integer not null default 1,
        created_at datetime not null,
        changed_at datetime not null,
        design_set_id text not null references design_set (id) on update cascade,
        name text not null,
        plan json not null
      )`);
    this.addSql('create index option_design_set_id_index on option (design_set_id)');
  }
}
