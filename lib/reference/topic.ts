import type { Result } from '@/lib/core/result'

/** What the core answers to the inputs of a reference case, by the names that cases use for outputs. */
export type Outputs = Readonly<Record<string, unknown>>

/** Gives the bytes of a capture that a case names. */
export type CaptureReader = (file: string) => Uint8Array

/** Answers every case of one topic from the core: parses the inputs, computes, or says why they are refused. */
export type Topic = (inputs: unknown, readCapture: CaptureReader) => Result<Outputs, string>

/** Topics by their names, such as “snubber.optimum”. */
export type Topics = Readonly<Record<string, Topic>>
