import { createServer } from 'node:net';
import { join } from 'node:path';
import { addressOf } from '../src/console.js';
import { tryListening } from '../src/listen-address.js';
import { prepareFolder } from '../src/open-database.js';
import { readSettings, SettingsError } from '../src/settings/settings.js';

describe('Settings', () => {
  test('have defaults for a newcomer on their own machine', () => {
    expect(readSettings({ PORT: '', STEELYARD_DEMO: ' ' })).toEqual({
      port: 4310,
      host: '127.0.0.1',
      database: join(__dirname, '../../../data/steelyard.sqlite'),
      demo: true,
      url: null,
      secureCookies: false,
    });
  });

  test('are taken from the environment', () => {
    const environment = {
      PORT: '8080',
      HOST: '0.0.0.0',
      STEELYARD_DATA: '/srv/steelyard',
      STEELYARD_DEMO: 'off',
      STEELYARD_URL: 'https://steelyard.example/',
      STEELYARD_SECURE_COOKIES: 'on',
    };
    expect(readSettings(environment)).toEqual({
      port: 8080,
      host: '0.0.0.0',
      database: '/srv/steelyard/steelyard.sqlite',
      demo: false,
      url: 'https://steelyard.example',
      secureCookies: true,
    });
  });

  test.each([
    [{ PORT: 'http' }, 'PORT must be a whole number from 1 to 65535, not “http”.'],
    [{ PORT: '70000' }, 'PORT must be a whole number from 1 to 65535, not “70000”.'],
    [{ STEELYARD_DEMO: 'yes' }, 'STEELYARD_DEMO must be “on” or “off”, not “yes”.'],
    [{ STEELYARD_SECURE_COOKIES: '1' }, 'STEELYARD_SECURE_COOKIES must be “on” or “off”, not “1”.'],
    [
      { STEELYARD_URL: 'steelyard' },
      'STEELYARD_URL must be the address people reach this server by, such as https://steelyard.example.org, not “steelyard”.',
    ],
  ])('that are wrong are named in a sentence: %j', (environment, sentence) => {
    expect(() => readSettings(environment)).toThrow(new SettingsError([sentence]));
  });

  test('that are wrong are all named at once', () => {
    expect.assertions(1);
    try {
      readSettings({ PORT: '0', STEELYARD_DEMO: 'maybe' });
    } catch (error) {
      expect((error as SettingsError).sentences).toHaveLength(2);
    }
  });

  test('with a data folder that cannot be are refused', () => {
    const settings = readSettings({ STEELYARD_DATA: join(__filename, 'data') });
    expect(() => prepareFolder(settings)).toThrow('STEELYARD_DATA must be a folder that can be written to');
  });

  test('with a port in use are refused before anything else happens', async () => {
    const other = createServer();
    await new Promise<void>((resolve) => other.listen(0, '127.0.0.1', resolve));
    const { port } = other.address() as { port: number };
    await expect(tryListening({ ...readSettings({}), port })).rejects.toMatchObject({ code: 'EADDRINUSE' });
    await new Promise((resolve) => other.close(resolve));
    await expect(tryListening({ ...readSettings({}), port })).resolves.toBeUndefined();
  });

  test.each([
    [{}, 'http://localhost:4310'],
    [{ HOST: '0.0.0.0', PORT: '80' }, 'http://localhost:80'],
    [{ HOST: '::1' }, 'http://[::1]:4310'],
    [{ STEELYARD_URL: 'https://steelyard.example' }, 'https://steelyard.example'],
  ])('say where people reach the server: %j', (environment, address) => {
    expect(addressOf(readSettings(environment))).toBe(address);
  });
});
