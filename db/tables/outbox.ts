export type OutboxMessageTable = {
  id: string
  kind: string
  recipient: string
  payload: string
  dedupe_key: string
  attempts: number
  next_attempt_at: number
  last_error: string | null
  sent_at: number | null
  created_at: number
}
