/** Invented text for the demo. A practice publishes its own, reviewed by a lawyer. */
export const termsBody = [
  'Demo text, not legal advice: a practice replaces it with terms that a lawyer has reviewed.',
  'What you send us - schematics, layouts, captures, scans, photographs and what you tell us about your product - stays yours. We use it only for the engagement it was sent for, show it only to the consultants assigned to that engagement, and tell nobody else that you asked.',
  'What we send you - findings, values, drawings and reports - is for your company. You may show a signed report to your suppliers, your customers and a test laboratory, whole and unchanged.',
  'Both sides keep the other’s information for as long as the engagement lasts and five years after, protect it as they protect their own, and delete it on request unless the law or the books require it to be kept.',
].join('\n\n')
