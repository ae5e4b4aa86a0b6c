import Link from 'next/link'

export type Crumb = { readonly label: string; readonly href?: string | undefined }

/** The way back up; the last crumb is this page and no link. */
export const Breadcrumbs = ({ crumbs }: { readonly crumbs: readonly Crumb[] }) => (
  <nav aria-label="Breadcrumb">
    <ol className="flex flex-wrap text-sm text-ink-soft">
      {crumbs.map((crumb, index) => (
        <li key={crumb.href ?? crumb.label} className="flex items-center">
          {crumb.href ? (
            <Link href={crumb.href} className="text-link inline-block py-0.5">
              {crumb.label}
            </Link>
          ) : (
            <span aria-current="page">{crumb.label}</span>
          )}
          {index < crumbs.length - 1 ? (
            <span aria-hidden="true" className="px-2 text-ink-faint">
              /
            </span>
          ) : null}
        </li>
      ))}
    </ol>
  </nav>
)
