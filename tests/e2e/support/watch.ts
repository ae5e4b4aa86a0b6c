import { expect, type BrowserContext, type Page } from '@playwright/test'

/** Collects what a page must never do: break the content security policy, throw, or log an error. */
export class Watch {
  readonly #complaints: string[] = []

  readonly #isExpected = (text: string) =>
    // The browser logs every answer of 4xx by itself; the walk provokes some on purpose.
    /Failed to load resource: the server responded with a status of 4\d\d/.test(text)

  async over(context: BrowserContext): Promise<void> {
    context.on('page', (page) => this.#listenTo(page))
    await context.addInitScript(() => {
      document.addEventListener('securitypolicyviolation', (event) => {
        console.error(`CSP: ${event.violatedDirective} ${event.blockedURI} ${event.sourceFile ?? ''}`)
      })
    })
  }

  #listenTo(page: Page): void {
    page.on('pageerror', (error) => this.#complaints.push(`${page.url()}: ${error.message}`))
    page.on('console', (message) => {
      if (message.type() !== 'error' || this.#isExpected(message.text())) return
      this.#complaints.push(`${page.url()}: ${message.text()}`)
    })
  }

  expectNothing(): void {
    expect(this.#complaints).toEqual([])
  }
}
