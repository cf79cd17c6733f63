import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { TestApp } from './support/test-app.js';

describe('The web application', () => {
  let app: TestApp;
  let folder: string;

  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'steelyard-web-'));
    await mkdir(join(folder, 'assets'));
    await writeFile(join(folder, 'index.html'), '<!doctype html><title>Steelyard</title>');
    await writeFile(join(folder, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
    await writeFile(
      join(folder, 'assets', 'app-1a2b.js'),
      `export const weights = '${'brass '.repeat(2000)}';`,
    );
    app = await TestApp.start({ webBuild: folder });
  });

  afterAll(async () => {
    await app.close();
    await rm(folder, { recursive: true });
  });

  test.each(['/', '/sign-in', '/welcome/AbC-12_x', '/studies/1b6f/weigh'])(
    'is served at the page path %s',
    async (path) => {
      const page = await app.get(path);
      expect(page.status).toBe(200);
      expect(page.type).toBe('text/html');
      expect(page.text).toContain('<title>Steelyard</title>');
      expect(page.headers['cache-control']).toBe('no-cache');
    },
  );

  test('has hashed files that browsers keep for ever, compressed', async () => {
    const asset = await app.get('/assets/app-1a2b.js').set('Accept-Encoding', 'gzip');
    expect(asset.status).toBe(200);
    expect(asset.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect(asset.headers['content-encoding']).toBe('gzip');
  });

  test('has other files that browsers ask for again', async () => {
    const icon = await app.get('/favicon.svg');
    expect(icon.status).toBe(200);
    expect(icon.headers['cache-control']).toBe('public, max-age=0');
  });

  test.each(['/assets/gone-9f.js', '/robots.txt', '/api', '/api/nowhere', '/assets/gone'])(
    'is no answer for %s',
    async (path) => {
      const response = await app.get(path);
      expect(response.status).toBe(404);
      expect(response.type).toBe('application/problem+json');
    },
  );

  test('answers no other method than reading', async () => {
    expect((await app.request('post', '/sign-in')).status).toBe(404);
    expect((await app.request('head', '/sign-in')).status).toBe(200);
  });
});

describe('The security headers', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await TestApp.start({ webBuild: '/no/such/folder' });
  });

  afterAll(() => app.close());

  const policy = async (path: string) => {
    const { headers } = await app.get(path);
    return headers['content-security-policy']?.split(';').toSorted();
  };

  test('allow nothing but the application’s own files, and style elements that start empty', async () => {
    const expected = [
      "base-uri 'none'",
      "default-src 'self'",
      "font-src 'self'",
      "form-action 'self'",
      "frame-ancestors 'none'",
      "img-src 'self' data:",
      "object-src 'none'",
      "script-src 'self'",
      "style-src 'self' 'sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU='",
    ];
    for (const path of ['/', '/api/health', '/api/nowhere', '/api/docs-of-something-else']) {
      expect(await policy(path)).toEqual(expected);
    }
  });

  test('let the documentation style itself, and no more', async () => {
    const strict = (await policy('/')) ?? [];
    const documentation = (await policy('/api/docs')) ?? [];
    expect(documentation.filter((directive) => !strict.includes(directive))).toEqual([
      "style-src 'self' 'unsafe-inline'",
    ]);
  });

  test('send nobody to TLS where there is none, and do not name the server', async () => {
    const { headers } = await app.get('/api/health');
    expect(headers['strict-transport-security']).toBeUndefined();
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['x-frame-options']).toBe('DENY');
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['cache-control']).toBe('no-store');
  });

  test('the server tells its health and its version', async () => {
    const response = await app.get('/api/health');
    expect(response.body).toEqual({ status: 'ok', version: '0.1.0', database: 'ok' });
  });
});
