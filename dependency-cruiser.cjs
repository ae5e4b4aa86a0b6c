const rule = (name, from, to, comment) => ({ name, severity: 'error', comment, from, to })
/** The domains in their order: each may use those before it, never those after it. */
const domains = ['identity', 'engagements', 'evidence', 'findings', 'hours', 'reports', 'billing']

const domainOrder = domains
  .slice(0, -1)
  .map((domain, index) =>
    rule(
      `domain-order-${domain}`,
      { path: `^lib/domain/${domain}/` },
      { path: `^lib/domain/(${domains.slice(index + 1).join('|')})/` },
      `${domain} comes before ${domains.slice(index + 1).join(', ')} and may not use them`,
    ),
  )

module.exports = {
  forbidden: [
    ...domainOrder,
    rule('no-circular', {}, { circular: true }),
    rule(
      'core-is-pure',
      { path: '^lib/core/' },
      { pathNot: '^lib/core/' },
      'lib/core imports only lib/core: no npm, no node:*, no framework',
    ),
    rule(
      'reference-is-core-and-schemas',
      { path: '^lib/reference/' },
      { pathNot: '^lib/(core|reference)/|(^|/)node_modules/zod/' },
      'lib/reference answers reference cases from lib/core alone',
    ),
    rule(
      'domain-has-no-framework',
      { path: '^lib/(domain|authz|ports)/' },
      {
        path: '^(app|components|emails|pdf|lib/(server|adapters))/|(^|/)(next|next-auth|react|stripe|resend)(/|$)',
      },
    ),
    rule(
      'sql-only-in-db',
      { pathNot: '^(db|migrations|tests)/' },
      { path: '(^|/)node_modules/(kysely|better-sqlite3)/' },
    ),
    rule(
      'repos-only-from-domain',
      { pathNot: '^(db|lib/(domain|server|commands)|migrations|tests)/' },
      { path: '^db/' },
    ),
    rule(
      'sdk-only-in-adapters',
      { pathNot: '^(lib/adapters|tests)/' },
      { path: '(^|/)node_modules/(stripe|resend)/' },
    ),
    rule(
      'routes-only-via-server',
      { path: '^app/' },
      { path: '^(db|migrations|lib/adapters|lib/domain|tests)/' },
      'app/ talks to lib/server, lib/core types and components only',
    ),
    rule(
      'components-are-leaves',
      { path: '^components/' },
      {
        path: '^(app|db|migrations|lib/(server|adapters|domain)|pdf|emails|tests)/',
        dependencyTypesNot: ['type-only'],
      },
    ),
    rule('ui-knows-no-domain', { path: '^components/ui/' }, { path: '^(components/(?!ui/)|lib/(?!core/))' }),
    rule('no-test-code-in-prod', { pathNot: '^tests/' }, { path: '^tests/' }),
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
  },
}
