import type { ChoiceInput } from '../method/input-definition'

/** One thing to look for in a layout: why it matters, and what to do where it is not so. */
export type GroundingQuestion = {
  readonly label: string
  readonly symbol: string
  readonly help: string
  readonly reason: string
  readonly remedy: string
}

const question = (
  symbol: string,
  label: string,
  help: string,
  reason: string,
  remedy: string,
): GroundingQuestion => ({ label, symbol, help, reason, remedy })

/** Common practice of the trade, no source: what a reviewer looks for before computing anything. */
export const groundingQuestions = {
  onePoint: question(
    '1',
    'Control ground meets power ground at one point',
    'At the controller’s ground pin or pad, not along a shared path',
    'Power current in a shared path lifts the reference of the controller by L di/dt.',
    'Join the two grounds at one place beside the controller and route its quiet parts to that place.',
  ),
  switchCurrents: question(
    '2',
    'Switched currents stay off the system ground',
    'The pulsed loop of switch, diode and input capacitor closes in its own copper',
    'Pulsed current through the common ground appears as noise in everything that refers to it.',
    'Close the pulsed loop on one layer or between two adjacent ones, with its own copper, and join it to the plane at one side.',
  ),
  hotLoop: question(
    '3',
    'The input capacitor stands beside the switch',
    'The smallest loop that carries the full di/dt',
    'Its inductance rings with the node and radiates by its area.',
    'Move a ceramic capacitor across the switch pins, with its return on the next layer below.',
  ),
  layerChanges: question(
    '4',
    'A return stands beside every layer change of a fast trace',
    'A ground via next to the signal via, or the same plane on both sides',
    'Without it the return current spreads until it finds another way, and the cavity between the planes is driven.',
    'Put a ground via within a few plane distances of each signal via.',
  ),
  uncutPlane: question(
    '5',
    'The plane under fast traces and the hot loop is not cut',
    'No slot, no row of clearances that joins up, no trace in the plane',
    'A cut sends the return current around it: a loop antenna of the size of the detour.',
    'Close the cut or move the trace; stitch across with capacitors only where the planes must differ.',
  ),
  connectors: question(
    '6',
    'Cable shields and connector grounds meet the chassis at the edge',
    'Short and wide, before any current can reach the board',
    'Common-mode current that reaches the board leaves by every other cable.',
    'Bond the shield to the chassis at the connector, all around it where that is possible.',
  ),
  quietSense: question(
    '7',
    'Sense and feedback lines run away from the switch node, over their own return',
    'As a pair, or over an unbroken plane',
    'A feedback line in the field of the switch node carries its edges into the control loop.',
    'Route it on the far side of the plane, as a pair from the point that is to be regulated.',
  ),
} as const satisfies Readonly<Record<string, GroundingQuestion>>

export type GroundingItem = keyof typeof groundingQuestions

export const groundingAnswers = { yes: 'Yes', no: 'No', unseen: 'Not seen' } as const

export type GroundingAnswer = keyof typeof groundingAnswers

type GroundingInput = Omit<ChoiceInput, 'isRequired' | 'options'> & {
  readonly isRequired: true
  readonly options: typeof groundingAnswers
}

/** A question as the input of a method. */
export const inputOf = ({ label, symbol, help }: GroundingQuestion): GroundingInput => ({
  kind: 'choice',
  label,
  symbol,
  help,
  isRequired: true,
  options: groundingAnswers,
})
