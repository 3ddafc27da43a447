import { describe, expect, test } from 'vitest';
import { NextRequest } from 'next/server';
import { contentSecurityPolicy, proxy } from '@/proxy';

const directive = (policy: string, name: string) =>
  policy.split('; ').find((part) => part.startsWith(`${name} `))?.slice(name.length + 1);

describe('content security policy', () => {
  test('lets only scripts and style sheets with the nonce run in production', () => {
    const policy = contentSecurityPolicy('N', false);
    expect(directive(policy, 'script-src')).toBe("'self' 'nonce-N' 'strict-dynamic'");
    expect(directive(policy, 'style-src')).toBe("'self' 'nonce-N'");
    expect(directive(policy, 'frame-ancestors')).toBe("'none'");
    expect(policy).not.toContain('unsafe-eval');
  });

  test('lets the development server evaluate and inject', () => {
    const policy = contentSecurityPolicy('N', true);
    expect(directive(policy, 'script-src')).toContain("'unsafe-eval'");
    expect(directive(policy, 'style-src')).toBe("'self' 'unsafe-inline'");
    expect(directive(policy, 'connect-src')).toContain('ws:');
  });

  test('lets the browser post photos to the storage, and to nobody else', () => {
    expect(directive(contentSecurityPolicy('N', false, 'https://s3.example.org/under'), 'connect-src')).toBe("'self' https://s3.example.org");
  });
});

describe('proxy', () => {
  const answer = () => proxy(new NextRequest('http://127.0.0.1:3000/'));

  test('hands the same nonce to the page and to the browser, a new one each time', () => {
    const response = answer();
    const nonce = response.headers.get('x-middleware-request-x-nonce');
    expect(nonce).toBeTruthy();
    expect(response.headers.get('content-security-policy')).toContain(`'nonce-${nonce}'`);
    expect(response.headers.get('x-middleware-request-content-security-policy')).toBe(response.headers.get('content-security-policy'));
    expect(answer().headers.get('x-middleware-request-x-nonce')).not.toBe(nonce);
  });

  test('says which page was asked for, whatever the browser claims', () => {
    const request = new NextRequest('http://127.0.0.1:3000/units?site=a', { headers: { 'x-path': '//elsewhere' } });
    expect(proxy(request).headers.get('x-middleware-request-x-path')).toBe('/units?site=a');
  });

  test('sets the security headers', () => {
    const { headers } = answer();
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('referrer-policy')).toBe('same-origin');
    expect(headers.get('permissions-policy')).toContain('camera=(self)');
  });
});
