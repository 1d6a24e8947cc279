import { type MigrationInterface, type QueryRunner } from 'typeorm';
import { PARTS, PARTS_TABLES } from './initial/parts.js';
import { TRAINS, TRAINS_TABLES } from './initial/trains.js';

const PEOPLE = [
  `CREATE TABLE "users" (
    "id" varchar PRIMARY KEY NOT NULL,
    "email" varchar NOT NULL COLLATE NOCASE,
    "name" varchar NOT NULL,
    "passwordHash" varchar NOT NULL,
    "roles" text NOT NULL,
    "active" boolean NOT NULL,
    "demo" boolean NOT NULL,
    "version" integer NOT NULL,
    "createdAt" text NOT NULL,
    "updatedAt" text NOT NULL
  )`,
  `CREATE UNIQUE INDEX "users_email" ON "users" ("email")`,
  `CREATE TABLE "sessions" (
    "id" varchar PRIMARY KEY NOT NULL,
    "userId" varchar NOT NULL,
    "createdAt" text NOT NULL,
    "seenAt" text NOT NULL,
    "expiresAt" text NOT NULL,
    CONSTRAINT "sessions_user" FOREIGN KEY ("userId") REFERENCES "users" ("id") ON DELETE CASCADE
  )`,
  `CREATE INDEX "sessions_user_id" ON "sessions" ("userId")`,
  `CREATE TABLE "invitations" (
    "id" varchar PRIMARY KEY NOT NULL,
    "tokenHash" varchar NOT NULL,
    "purpose" varchar NOT NULL,
    "createdAt" text NOT NULL,
    "expiresAt" text NOT NULL
  )`,
  `CREATE UNIQUE INDEX "invitations_token" ON "invitations" ("tokenHash")`,
];

const AUDIT = [
  `CREATE TABLE "audit_entries" (
    "id" integer PRIMARY KEY AUTOINCREMENT NOT NULL,
    "at" text NOT NULL,
    "actorId" varchar,
    "actorName" varchar NOT NULL,
    "action" varchar NOT NULL,
    "entity" varchar NOT NULL,
    "entityId" varchar NOT NULL,
    "summary" text NOT NULL,
    "before" text,
    "after" text
  )`,
  `CREATE INDEX "audit_entries_entity" ON "audit_entries" ("entity", "entityId", "id")`,
  // The record is only ever added to.
  `CREATE TRIGGER "audit_entries_keep" BEFORE UPDATE ON "audit_entries"
    BEGIN SELECT RAISE(ABORT, 'audit entries are never changed'); END`,
  `CREATE TRIGGER "audit_entries_stay" BEFORE DELETE ON "audit_entries"
    BEGIN SELECT RAISE(ABORT, 'audit entries are never deleted'); END`,
];

/** Every table of the first issue. Each room keeps its statements in a list of its own. */
export class Initial1764600000000 implements MigrationInterface {
  name = 'Initial1764600000000';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of [...PEOPLE, ...AUDIT, ...PARTS, ...TRAINS]) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of [
      ...TRAINS_TABLES,
      ...PARTS_TABLES,
      'audit_entries',
      'invitations',
      'sessions',
      'users',
    ]) {
      await runner.query(`DROP TABLE "${table}"`);
    }
  }
}
