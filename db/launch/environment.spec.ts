import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { readSettings, serverEnvironment } from './environment.mjs';
import { projectRoot } from './paths.mjs';

describe('the launcher reads its settings', () => {
  it('needs none at all', () => {
    expect(readSettings({})).toEqual({
      dev: false,
      host: '127.0.0.1',
      port: 4180,
      publicUrl: 'http://localhost:4180',
      dataDirectory: path.join(projectRoot, '.data'),
      demo: true,
      ownDatabase: true,
      ownStorage: true,
      ownMail: true,
    });
  });

  it('starts nothing that a variable names elsewhere', () => {
    const env = { DATABASE_URL: 'mysql://a:b@db/w', S3_ENDPOINT: 'https://s3', SMTP_URL: 'smtp://mail' };
    expect(readSettings(env)).toMatchObject({ ownDatabase: false, ownStorage: false, ownMail: false });
  });

  it('takes an empty variable for one that is not set', () => {
    const env = {
      PORT: '',
      HOST: '',
      DATA_DIR: '',
      DATABASE_URL: '',
      S3_ENDPOINT: '',
      SMTP_URL: '',
      DEMO: '',
    };
    expect(readSettings(env)).toEqual(readSettings({}));
  });

  it('takes DATA_DIR from the project, or as an absolute path, and drops the slash behind PUBLIC_URL', () => {
    expect(readSettings({ DATA_DIR: 'elsewhere' }).dataDirectory).toBe(path.join(projectRoot, 'elsewhere'));
    expect(readSettings({ DATA_DIR: '/srv/w' }).dataDirectory).toBe('/srv/w');
    expect(readSettings({ PUBLIC_URL: 'https://panel.lantern.example/' }).publicUrl).toBe(
      'https://panel.lantern.example',
    );
  });

  it.each(['0', '65536', '-1', '4e3', '80.5', 'http', ' 4180', '0x50'])('refuses PORT=%s', (PORT) => {
    expect(() => readSettings({ PORT })).toThrow(/^PORT is /);
  });

  it('names everything that is wrong at once, and repeats no address with a password in it', () => {
    const wrong = { PORT: 'x', DEMO: 'yes', DATABASE_URL: 'postgres://me:hidden@db/w' };
    let message = '';
    try {
      readSettings(wrong, ['--fast']);
    } catch (error) {
      message = (error as Error).message;
    }
    expect(message.split('\n')).toHaveLength(4);
    for (const name of ['PORT', 'DEMO', 'DATABASE_URL', '--fast']) expect(message).toContain(name);
    expect(message).not.toContain('hidden');
  });
});

describe('the environment of the server', () => {
  it('is complete without any setting, and what was started wins over nothing', () => {
    const env = serverEnvironment(readSettings({}), {
      env: { PATH: '/bin' },
      secrets: { SESSION_SECRET: 's', IDENTITY_KEY: 'k' },
      services: {
        DATABASE_URL: 'mysql://started',
        S3_ENDPOINT: 'http://started',
        SMTP_URL: 'smtp://started',
      },
    });
    expect(env).toMatchObject({
      PATH: '/bin',
      NODE_ENV: 'production',
      HOST: '127.0.0.1',
      PORT: '4180',
      PUBLIC_URL: 'http://localhost:4180',
      DEMO: '1',
      DATABASE_URL: 'mysql://started',
      S3_ENDPOINT: 'http://started',
      SMTP_URL: 'smtp://started',
      SESSION_SECRET: 's',
      IDENTITY_KEY: 'k',
    });
  });

  it('keeps what the caller set', () => {
    const env = {
      DATABASE_URL: 'mysql://mine/w',
      TIME_ZONE: 'Europe/Berlin',
      MAIL_FROM: 'a@b',
    };
    expect(serverEnvironment(readSettings(env), { env, secrets: {}, services: {} })).toMatchObject(env);
  });
});
