import type { AnyEndpoint } from '@seamwright/shared/contracts';

const escape = (text: string): string =>
  text.replace(/[&<>"]/g, (sign) => ({ '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' })[sign] ?? sign);

const fields = (title: string, names: readonly string[]): string =>
  names.length ? `<p>${title}: ${names.map((name) => `<code>${escape(name)}</code>`).join(', ')}</p>` : '';

function section(endpoint: AnyEndpoint): string {
  const { access } = endpoint;
  const needs = [endpoint.idempotent ? 'Idempotency-Key' : '', endpoint.guarded ? 'If-Match' : ''].filter(Boolean);
  return `<section id="${escape(endpoint.id)}"><h3><b>${endpoint.method}</b> <code>/api/v1${escape(endpoint.path)}</code></h3>
<p>${escape(endpoint.summary)}</p><p>${access.who === 'anyone' ? 'Anyone may call this.' : `For: ${access.roles.join(', ')}`}</p>
${fields('Query', Object.keys(endpoint.query.shape))}${fields('Headers', needs)}</section>`;
}

/** A reading page of the endpoints, by resource; the exact shapes are in the OpenAPI document. */
export function docsPage(endpoints: readonly AnyEndpoint[]): string {
  const resources = [...new Set(endpoints.map((endpoint) => endpoint.id.split('.')[0] ?? ''))].sort();
  const body = resources.map((resource) => {
    const own = endpoints.filter((endpoint) => endpoint.id.startsWith(`${resource}.`));
    return `<h2>${escape(resource)}</h2>${own.map(section).join('')}`;
  });
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>Seamwright API</title><style>
:root{color-scheme:light dark}body{max-width:60rem;margin:2rem auto;padding:0 1rem;font:16px/1.5 system-ui,sans-serif}
section{border-top:1px solid color-mix(in srgb,currentColor 25%,transparent);padding:.5rem 0}h3{font-weight:400;margin:.5rem 0}
code{overflow-wrap:anywhere}p{margin:.25rem 0}</style></head><body><main>
<h1>Seamwright API</h1><p>Every endpoint, from its declaration. Shapes: <a href="/api/openapi.json">OpenAPI document</a>.</p>
${body.join('')}</main></body></html>`;
}
