import { Migration } from '@mikro-orm/migrations'

/** A revision is written once. Its release is written once, later; nothing else of it ever changes. */
const keepRevision = `create function keep_revision() returns trigger language plpgsql as $$
begin
  if (to_jsonb(new) - 'released_at' - 'released_by_id' - 'release_reasons')
    is distinct from (to_jsonb(old) - 'released_at' - 'released_by_id' - 'release_reasons') then
    raise exception 'a revision is never changed' using errcode = 'restrict_violation';
  end if;
  if old.released_at is not null then
    raise exception 'a released revision is never changed' using errcode = 'restrict_violation';
  end if;
  if new.released_at is null or new.released_by_id is null or new.release_reasons is null then
    raise exception 'a release names its time, its person and its reasons' using errcode = 'restrict_violation';
  end if;
  return new;
end $$`

/** While its scenario is there, a revision stays; when the scenario's row goes, its revisions follow. */
const holdRevision = `create function hold_revision() returns trigger language plpgsql as $$
begin
  if exists (select 1 from scenarios where id = old.scenario_id) then
    raise exception 'a revision is never removed' using errcode = 'restrict_violation';
  end if;
  return old;
end $$`

const holdAllRevisions = `create function hold_all_revisions() returns trigger language plpgsql as $$
begin
  raise exception 'revisions are never removed' using errcode = 'restrict_violation';
end $$`

export class Migration20261201042707_records extends Migration {
  override async up(): Promise<void> {
    // Both are trusted: the owner of the database may create them. Numbers inside names sort by value: J260-9 before J260-10.
    this.addSql(`create extension if not exists pg_trgm`)
    this.addSql(`create collation if not exists "natural_order" (provider = icu, locale = 'und-u-kn-true')`)

    this.addSql(`create table "engines" ("id" uuid not null default gen_random_uuid(), "shop_id" uuid not null, "name" varchar(80) not null, "code" varchar(12) not null, "spec" jsonb not null, "version" int not null default 1, "last_scenario_number" int not null default 0, "archived_at" timestamptz(3) null, "created_by_id" uuid not null, "created_at" timestamptz(3) not null default now(), "updated_at" timestamptz(3) not null default now(), "search" text not null, constraint "engines_pkey" primary key ("id"));`)
    this.addSql(`create unique index "engines_shop_code_unique" on "engines" ("shop_id", lower("code"));`)
    this.addSql(`create index "engines_shop_updated_index" on "engines" ("shop_id", "updated_at" desc, "id" desc);`)
    this.addSql(`create index "engines_search_index" on "engines" using gin ("search" gin_trgm_ops) with (fastupdate = off);`)
    this.addSql(`create index "engines_created_by_index" on "engines" ("created_by_id");`)

    this.addSql(`create table "scenarios" ("id" uuid not null default gen_random_uuid(), "shop_id" uuid not null, "engine_id" uuid not null, "code" varchar(24) not null, "title" varchar(120) not null, "owner_id" uuid not null, "current_revision" int not null, "outside_count" int not null, "close_count" int not null, "within_count" int not null, "released_revision" int null, "archived_at" timestamptz(3) null, "created_at" timestamptz(3) not null default now(), "updated_at" timestamptz(3) not null default now(), "version" int not null default 1, "search" text not null, constraint "scenarios_pkey" primary key ("id"));`)
    this.addSql(`create index "scenarios_updated_index" on "scenarios" ("shop_id", "updated_at" desc, "id" desc) where "archived_at" is null;`)
    this.addSql(`create index "scenarios_title_index" on "scenarios" ("shop_id", "title" collate "natural_order", "id") where "archived_at" is null;`)
    this.addSql(`create index "scenarios_code_index" on "scenarios" ("shop_id", "code" collate "natural_order", "id") where "archived_at" is null;`)
    this.addSql(`create index "scenarios_outside_index" on "scenarios" ("shop_id", "outside_count" desc, "updated_at" desc, "id" desc) where "archived_at" is null;`)
    this.addSql(`create index "scenarios_owner_index" on "scenarios" ("owner_id", "shop_id", "updated_at" desc, "id" desc) where "archived_at" is null;`)
    this.addSql(`create index "scenarios_engine_index" on "scenarios" ("engine_id", "shop_id", "updated_at" desc, "id" desc) where "archived_at" is null;`)
    this.addSql(`create index "scenarios_archived_index" on "scenarios" ("shop_id", "updated_at" desc, "id" desc) where "archived_at" is not null;`)
    this.addSql(`create index "scenarios_released_index" on "scenarios" ("shop_id", "updated_at" desc, "id" desc) where "archived_at" is null and "released_revision" is not null;`)
    this.addSql(`create index "scenarios_engine_id_index" on "scenarios" ("engine_id");`)
    this.addSql(`create index "scenarios_search_index" on "scenarios" using gin ("search" gin_trgm_ops) with (fastupdate = off);`)
    this.addSql(`alter table "scenarios" add constraint "scenarios_shop_code_unique" unique ("shop_id", "code");`)

    this.addSql(`create table "revisions" ("id" uuid not null default gen_random_uuid(), "scenario_id" uuid not null, "shop_id" uuid not null, "number" int not null, "title" varchar(120) not null, "sheet" jsonb not null, "sheet_version" int not null, "engine_version" int not null, "engine" jsonb not null, "results" jsonb not null, "outside_count" int not null, "close_count" int not null, "within_count" int not null, "limits" jsonb not null, "calc_version" varchar(32) not null, "author_id" uuid not null, "created_at" timestamptz(3) not null default now(), "released_at" timestamptz(3) null, "released_by_id" uuid null, "release_reasons" jsonb null, "search" text not null, constraint "revisions_pkey" primary key ("id"));`)
    this.addSql(`create index "revisions_released_index" on "revisions" ("shop_id", "released_at" desc, "id" desc) where "released_at" is not null;`)
    this.addSql(`create index "revisions_search_index" on "revisions" using gin ("search" gin_trgm_ops) with (fastupdate = off) where "released_at" is not null;`)
    this.addSql(`create index "revisions_author_index" on "revisions" ("author_id");`)
    this.addSql(`alter table "revisions" add constraint "revisions_scenario_number_unique" unique ("scenario_id", "number");`)

    this.addSql(`alter table "engines" add constraint "engines_shop_id_foreign" foreign key ("shop_id") references "shops" ("id") on update cascade;`)
    this.addSql(`alter table "engines" add constraint "engines_created_by_id_foreign" foreign key ("created_by_id") references "users" ("id") on update cascade;`)

    this.addSql(`alter table "scenarios" add constraint "scenarios_shop_id_foreign" foreign key ("shop_id") references "shops" ("id") on update cascade;`)
    this.addSql(`alter table "scenarios" add constraint "scenarios_engine_id_foreign" foreign key ("engine_id") references "engines" ("id") on update cascade;`)
    this.addSql(`alter table "scenarios" add constraint "scenarios_owner_id_foreign" foreign key ("owner_id") references "users" ("id") on update cascade;`)

    this.addSql(`alter table "revisions" add constraint "revisions_scenario_id_foreign" foreign key ("scenario_id") references "scenarios" ("id") on update cascade on delete cascade;`)
    this.addSql(`alter table "revisions" add constraint "revisions_shop_id_foreign" foreign key ("shop_id") references "shops" ("id") on update cascade;`)
    this.addSql(`alter table "revisions" add constraint "revisions_author_id_foreign" foreign key ("author_id") references "users" ("id") on update cascade;`)
    this.addSql(`alter table "revisions" add constraint "revisions_released_by_id_foreign" foreign key ("released_by_id") references "users" ("id") on update cascade on delete no action;`)

    this.addSql(keepRevision)
    this.addSql(holdRevision)
    this.addSql(holdAllRevisions)
    this.addSql(`create trigger keep_revision before update on "revisions" for each row execute function keep_revision()`)
    this.addSql(`create trigger hold_revision before delete on "revisions" for each row execute function hold_revision()`)
    this.addSql(`create trigger hold_all_revisions before truncate on "revisions" for each statement execute function hold_all_revisions()`)
  }

  override async down(): Promise<void> {
    this.addSql(`alter table "scenarios" drop constraint "scenarios_engine_id_foreign";`)

    this.addSql(`alter table "revisions" drop constraint "revisions_scenario_id_foreign";`)

    this.addSql(`drop table if exists "engines" cascade;`)

    this.addSql(`drop table if exists "scenarios" cascade;`)

    this.addSql(`drop table if exists "revisions" cascade;`)

    this.addSql(`drop function if exists keep_revision, hold_revision, hold_all_revisions`)
    // pg_trgm stays: it may have been there before.
    this.addSql(`drop collation if exists "natural_order"`)
  }
}
