import { isIP } from 'node:net';
import path from 'node:path';
import { isLoopbackHost } from './loopback.js';

export const LOG_LEVELS = ['silent', 'fatal', 'error', 'warn', 'info', 'debug', 'trace'] as const;
export type LogLevel = (typeof LOG_LEVELS)[number];

/** What the environment decides; read once at start. */
export interface Settings {
  host: string;
  /** 0 asks the system for a free port. */
  port: number;
  /** Absolute path of the folder that holds the database and the secrets. */
  dataDir: string;
  /** Known accounts and open API pages; only ever on a machine's own address. */
  demo: boolean;
  /** Origin under which people reach the server, without a trailing slash. */
  publicUrl: string | null;
  smtpUrl: string | null;
  mailFrom: string | null;
  logLevel: LogLevel;
}

export const SETTINGS = Symbol('settings');

/** Lists every setting that cannot be used, each with what to write instead. */
export class SettingsError extends Error {
  constructor(readonly problems: string[]) {
    super(`The settings cannot be used:\n${problems.map((problem) => `  - ${problem}`).join('\n')}`);
    this.name = 'SettingsError';
  }
}

type Environment = Record<string, string | undefined>;

/**
 * Reads and checks the settings. Empty text counts as not set.
 * @throws SettingsError naming every setting at fault
 */
export function loadSettings(env: Environment): Settings {
  const problems: string[] = [];
  const read = (name: string): string | null => env[name]?.trim() || null;
  const publicUrl = publicUrlOf(read('PUBLIC_URL'), problems);
  const settings: Settings = {
    host: hostOf(read('HOST'), problems),
    port: portOf(read('PORT'), problems),
    dataDir: path.resolve(read('STAGEYARD_DATA') ?? 'data'),
    demo: demoOf(read('STAGEYARD_DEMO'), problems) && isOwnAddress(publicUrl),
    publicUrl,
    smtpUrl: smtpUrlOf(read('SMTP_URL'), problems),
    mailFrom: mailFromOf(read('MAIL_FROM'), problems),
    logLevel: logLevelOf(read('LOG_LEVEL'), problems),
  };
  if (problems.length > 0) throw new SettingsError(problems);
  return settings;
}

function isOwnAddress(publicUrl: string | null): boolean {
  return publicUrl === null || isLoopbackHost(new URL(publicUrl).host);
}

function hostOf(text: string | null, problems: string[]): string {
  const host = text ?? '127.0.0.1';
  const isName = /^(?=.{1,253}$)[a-z0-9]([a-z0-9-]*[a-z0-9])?(\.[a-z0-9]([a-z0-9-]*[a-z0-9])?)*$/i.test(host);
  if (isIP(host) === 0 && !isName) {
    problems.push(`HOST is “${host}”. Write an address or a host name, such as 127.0.0.1.`);
  }
  return host;
}

function portOf(text: string | null, problems: string[]): number {
  const port = text === null ? 3000 : Number(text);
  if ((text !== null && !/^\d{1,5}$/.test(text)) || port > 65535) {
    problems.push(`PORT is “${text}”. Write a whole number from 0 to 65535, such as 3000.`);
  }
  return port;
}

function demoOf(text: string | null, problems: string[]): boolean {
  if (text === null || text === 'on') return true;
  if (text !== 'off') problems.push(`STAGEYARD_DEMO is “${text}”. Write on or off.`);
  return false;
}

function publicUrlOf(text: string | null, problems: string[]): string | null {
  if (text === null) return null;
  const url = URL.canParse(text) ? new URL(text) : null;
  const isPlainOrigin = url !== null && url.pathname === '/' && !url.search && !url.hash && !url.username;
  if (url === null || !['http:', 'https:'].includes(url.protocol) || !isPlainOrigin) {
    problems.push(
      `PUBLIC_URL is “${text}”. Write the address without a path, such as https://gears.example.com.`,
    );
    return null;
  }
  return url.origin;
}

function smtpUrlOf(text: string | null, problems: string[]): string | null {
  if (text === null) return null;
  const url = URL.canParse(text) ? new URL(text) : null;
  if (url === null || !['smtp:', 'smtps:'].includes(url.protocol) || url.hostname === '') {
    // The text may hold a password, so it is not repeated.
    problems.push('SMTP_URL cannot be read. Write it like smtp://mail.example.com:587.');
    return null;
  }
  return text;
}

function mailFromOf(text: string | null, problems: string[]): string | null {
  if (text !== null && !/^([^<>\r\n]{0,200}<)?[^\s<>@]+@[^\s<>@]+>?$/.test(text)) {
    problems.push(`MAIL_FROM is “${text}”. Write an e-mail address, such as gears@example.com.`);
  }
  return text;
}

function logLevelOf(text: string | null, problems: string[]): LogLevel {
  const level = LOG_LEVELS.find((known) => known === (text ?? 'info'));
  if (level === undefined) problems.push(`LOG_LEVEL is “${text}”. Write one of: ${LOG_LEVELS.join(', ')}.`);
  return level ?? 'info';
}
