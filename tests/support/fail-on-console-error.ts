import { afterEach, beforeEach, expect, vi } from 'vitest'

// An error nobody expected is a failed test, whatever the assertions say.
beforeEach(() => {
  vi.spyOn(console, 'error')
})

afterEach(() => {
  expect(console.error).not.toHaveBeenCalled()
  vi.restoreAllMocks()
})
