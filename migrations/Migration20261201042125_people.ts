import { Migration } from '@mikro-orm/migrations'

export class Migration20261201042125_people extends Migration {
  override async up(): Promise<void> {
    this.addSql(`create table "shops" ("id" uuid not null default gen_random_uuid(), "name" varchar(80) not null, "releases_outside_allowed" boolean not null default true, "created_at" timestamptz not null default now(), constraint "shops_pkey" primary key ("id"));`)

    this.addSql(`create table "sign_in_limits" ("key" varchar(255) not null, "points" int not null default 0, "expire" bigint null, constraint "sign_in_limits_pkey" primary key ("key"));`)

    this.addSql(`create table "users" ("id" uuid not null default gen_random_uuid(), "email" varchar(254) not null, "name" varchar(80) not null, "password_hash" text not null, "unit_system" text check ("unit_system" in ('metric', 'us')) not null default 'metric', "created_at" timestamptz not null default now(), constraint "users_pkey" primary key ("id"), constraint users_email_lower check (email = lower(email)));`)
    this.addSql(`alter table "users" add constraint "users_email_unique" unique ("email");`)

    this.addSql(`create table "sessions" ("id" text not null, "user_id" uuid not null, "expires_at" timestamptz not null, "shop_id" uuid null, constraint "sessions_pkey" primary key ("id"));`)
    this.addSql(`create index "sessions_user_index" on "sessions" ("user_id");`)
    this.addSql(`create index "sessions_shop_index" on "sessions" ("shop_id");`)

    this.addSql(`create table "memberships" ("id" uuid not null default gen_random_uuid(), "user_id" uuid not null, "shop_id" uuid not null, "role" text check ("role" in ('builder', 'designer', 'technician', 'inspector', 'instructor', 'owner')) not null, "created_at" timestamptz not null default now(), constraint "memberships_pkey" primary key ("id"));`)
    this.addSql(`create index "memberships_shop_index" on "memberships" ("shop_id");`)
    this.addSql(`alter table "memberships" add constraint "memberships_user_shop_unique" unique ("user_id", "shop_id");`)

    this.addSql(`alter table "sessions" add constraint "sessions_user_id_foreign" foreign key ("user_id") references "users" ("id") on update cascade on delete cascade;`)
    this.addSql(`alter table "sessions" add constraint "sessions_shop_id_foreign" foreign key ("shop_id") references "shops" ("id") on update cascade on delete set null;`)

    this.addSql(`alter table "memberships" add constraint "memberships_user_id_foreign" foreign key ("user_id") references "users" ("id") on update cascade on delete cascade;`)
    this.addSql(`alter table "memberships" add constraint "memberships_shop_id_foreign" foreign key ("shop_id") references "shops" ("id") on update cascade on delete cascade;`)
  }

  override async down(): Promise<void> {
    this.addSql(`alter table "sessions" drop constraint "sessions_shop_id_foreign";`)

    this.addSql(`alter table "memberships" drop constraint "memberships_shop_id_foreign";`)

    this.addSql(`alter table "sessions" drop constraint "sessions_user_id_foreign";`)

    this.addSql(`alter table "memberships" drop constraint "memberships_user_id_foreign";`)

    this.addSql(`drop table if exists "shops" cascade;`)

    this.addSql(`drop table if exists "sign_in_limits" cascade;`)

    this.addSql(`drop table if exists "users" cascade;`)

    this.addSql(`drop table if exists "sessions" cascade;`)

    this.addSql(`drop table if exists "memberships" cascade;`)
  }
}
