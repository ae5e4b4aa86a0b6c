import 'server-only'

import { container } from './container'

/** The practice's name as it stands at the head of every page. */
export const practiceName = (): string => container().env.practice.name

/** The largest single upload, as the upload page says it. */
export const uploadLimitBytes = (): number => container().env.uploadLimitBytes
