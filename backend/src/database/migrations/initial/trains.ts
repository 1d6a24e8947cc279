/** Briefs, their searches and pins, and trains. */
export const TRAINS = [
  `CREATE TABLE "brief" (
    "id" integer PRIMARY KEY AUTOINCREMENT NOT NULL,
    "code" text NOT NULL,
    "title" text NOT NULL,
    "note" text NOT NULL,
    "requirement" text NOT NULL,
    "standing" text NOT NULL,
    "ownerId" varchar NOT NULL,
    "version" integer NOT NULL,
    "createdAt" text NOT NULL,
    "updatedAt" text NOT NULL,
    CONSTRAINT "brief_owner_user" FOREIGN KEY ("ownerId") REFERENCES "users" ("id")
  )`,
  `CREATE UNIQUE INDEX "brief_code" ON "brief" ("code")`,
  `CREATE INDEX "brief_owner" ON "brief" ("ownerId")`,
  `CREATE TABLE "option_search" (
    "id" integer PRIMARY KEY AUTOINCREMENT NOT NULL,
    "briefId" integer NOT NULL,
    "briefVersion" integer NOT NULL,
    "state" text NOT NULL,
    "request" text NOT NULL,
    "outcome" text,
    "optionCount" integer,
    "complete" boolean,
    "message" text,
    "startedById" varchar NOT NULL,
    "startedAt" text NOT NULL,
    "finishedAt" text,
    CONSTRAINT "option_search_brief_row" FOREIGN KEY ("briefId") REFERENCES "brief" ("id"),
    CONSTRAINT "option_search_user" FOREIGN KEY ("startedById") REFERENCES "users" ("id")
  )`,
  `CREATE INDEX "option_search_brief" ON "option_search" ("briefId", "id")`,
  `CREATE INDEX "option_search_state" ON "option_search" ("state")`,
  `CREATE TABLE "pin" (
    "id" integer PRIMARY KEY AUTOINCREMENT NOT NULL,
    "briefId" integer NOT NULL,
    "optionKey" text NOT NULL,
    "searchId" integer NOT NULL,
    "option" text NOT NULL,
    "pinnedAt" text NOT NULL,
    "pinnedById" varchar NOT NULL,
    CONSTRAINT "pin_brief_row" FOREIGN KEY ("briefId") REFERENCES "brief" ("id"),
    CONSTRAINT "pin_search_row" FOREIGN KEY ("searchId") REFERENCES "option_search" ("id"),
    CONSTRAINT "pin_user" FOREIGN KEY ("pinnedById") REFERENCES "users" ("id")
  )`,
  `CREATE UNIQUE INDEX "pin_brief_key" ON "pin" ("briefId", "optionKey")`,
  `CREATE TABLE "train" (
    "id" integer PRIMARY KEY AUTOINCREMENT NOT NULL,
    "code" text NOT NULL,
    "title" text NOT NULL,
    "note" text NOT NULL,
    "revision" text NOT NULL,
    "state" text NOT NULL,
    "briefId" integer,
    "optionKey" text NOT NULL,
    "spec" text NOT NULL,
    "ownerId" varchar NOT NULL,
    "version" integer NOT NULL,
    "createdAt" text NOT NULL,
    "updatedAt" text NOT NULL,
    CONSTRAINT "train_brief_row" FOREIGN KEY ("briefId") REFERENCES "brief" ("id"),
    CONSTRAINT "train_user" FOREIGN KEY ("ownerId") REFERENCES "users" ("id")
  )`,
  `CREATE UNIQUE INDEX "train_code" ON "train" ("code")`,
  `CREATE INDEX "train_brief" ON "train" ("briefId")`,
  `CREATE INDEX "train_owner" ON "train" ("ownerId")`,
];

/** Children first, as they are dropped. */
export const TRAINS_TABLES = ['train', 'pin', 'option_search', 'brief'];
