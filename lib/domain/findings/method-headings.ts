import { methodGroups } from '@/lib/core/method/registry'

export type MethodHeading = { readonly methodId: string; readonly title: string; readonly purpose: string }

export type MethodHeadings = { readonly title: string; readonly methods: readonly MethodHeading[] }

/** The methods of the practice by their subject, without what only their own pages show. */
export const methodHeadings = (): readonly MethodHeadings[] =>
  methodGroups.map(({ title, methods }) => ({
    title,
    methods: methods.map(({ id, title: name, purpose }) => ({ methodId: id, title: name, purpose })),
  }))
