import express from 'express';
import request from 'supertest';

import { securityHeaders } from '../../../server/http/security-headers';

const app = express()
  .use(securityHeaders())
  .get('/', (_request, response) => {
    response.send('page');
  });
const headers = async () => (await request(app).get('/').expect(200)).headers;
const policy = async () => {
  const text = String((await headers())['content-security-policy']);
  return new Map(text.split(';').map((part) => [part.split(' ')[0], part.split(' ').slice(1)]));
};

it('allows scripts, fonts, connections and manifests from this server only', async () => {
  const found = await policy();
  for (const directive of ['default-src', 'font-src', 'connect-src', 'manifest-src']) {
    expect({ directive, sources: found.get(directive) }).toEqual({
      directive,
      sources: ["'self'"],
    });
  }
  expect(found.get('script-src')).toEqual(["'self'", "'wasm-unsafe-eval'"]);
  expect(found.get('worker-src')).toEqual(["'self'", 'blob:']);
});

it('allows no inline script or style, no eval, no plug-in, no frame, no other base', async () => {
  const text = String((await headers())['content-security-policy']);
  expect(text).not.toMatch(/'unsafe-(inline|eval|hashes)'|\*|https?:/);
  const found = await policy();
  for (const directive of ['object-src', 'frame-ancestors', 'base-uri']) {
    expect({ directive, sources: found.get(directive) }).toEqual({
      directive,
      sources: ["'none'"],
    });
  }
  // the hash of nothing admits an empty <style> and no text at all
  expect(found.get('style-src')).toEqual([
    "'self'",
    "'sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU='",
  ]);
});

it('isolates its own window, tells no address to others, and lets no type be guessed', async () => {
  expect(await headers()).toMatchObject({
    'cross-origin-opener-policy': 'same-origin',
    'cross-origin-resource-policy': 'same-origin',
    'referrer-policy': 'no-referrer',
    'x-content-type-options': 'nosniff',
    'x-frame-options': 'SAMEORIGIN',
  });
});

it('asks for no cross-origin isolation, which the store in the browser does not need', async () => {
  expect(await headers()).not.toHaveProperty('cross-origin-embedder-policy');
});
