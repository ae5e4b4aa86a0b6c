'use server'

import { action } from '@/lib/server/action'
import { books } from '@/lib/server/operations'

export const fetchFees = action(books.fetchFees)
