import { defineMethod } from '../method/method'
import { main } from '../method/result-value'
import { ok } from '../result'
import {
  groundingAnswers,
  groundingQuestions,
  inputOf,
  type GroundingAnswer,
  type GroundingItem,
} from './grounding-questions'

const items = Object.keys(groundingQuestions) as readonly GroundingItem[]

/** A structured look at how a layout returns its currents. */
export const groundingReview = defineMethod({
  id: 'grounding-review',
  version: 1,
  title: 'Grounding review',
  purpose:
    'Goes through what a reviewer looks for in the return paths of a switching supply, and says what to do about each thing that is not so.',
  inputs: {
    onePoint: inputOf(groundingQuestions.onePoint),
    switchCurrents: inputOf(groundingQuestions.switchCurrents),
    hotLoop: inputOf(groundingQuestions.hotLoop),
    layerChanges: inputOf(groundingQuestions.layerChanges),
    uncutPlane: inputOf(groundingQuestions.uncutPlane),
    connectors: inputOf(groundingQuestions.connectors),
    quietSense: inputOf(groundingQuestions.quietSense),
  },
  formulas: ['Each item: as it should be, not so, or not seen in the evidence'],
  notes: [
    'Each item is common practice of the trade without a source; the counts are no score and say nothing about a limit.',
    'What was not seen is a question to the client, not a fault.',
  ],
  cautions: [
    'A safety earth is never opened or rerouted to quiet a circuit: local codes and licensed practice come first.',
  ],
  sources: [{ citation: 'Items of the review', standing: 'common practice, no source' }],
  example: {
    onePoint: 'yes',
    switchCurrents: 'no',
    hotLoop: 'no',
    layerChanges: 'unseen',
    uncutPlane: 'yes',
    connectors: 'yes',
    quietSense: 'yes',
  },
  compute: (answers) => {
    const count = (wanted: GroundingAnswer) => items.filter((item) => answers[item] === wanted).length
    const unseen = count('unseen')
    return ok({
      results: [
        main('toChange', 'Items that are not so', 'n_no', '', count('no')),
        main('unseen', 'Items not seen', 'n_?', '', unseen),
        main('asItShould', 'Items as they should be', 'n_yes', '', count('yes')),
      ],
      choices: [
        {
          title: 'Item by item',
          columns: [
            { label: 'Item', unit: 'text' },
            { label: 'Answer', unit: 'text' },
            { label: 'Why it matters', unit: 'text' },
            { label: 'What to do', unit: 'text' },
          ],
          rows: items.map((item) => {
            const { label, reason, remedy } = groundingQuestions[item]
            const answer = answers[item]
            return [label, groundingAnswers[answer], reason, whatToDo(answer, remedy)]
          }),
        },
      ],
      validity: [
        {
          passed: unseen === 0,
          sentence:
            unseen === 0
              ? 'Every item was seen in the evidence.'
              : 'Not every item was seen: ask for the layers or views that show the rest.',
        },
      ],
      figures: [],
    })
  },
})

function whatToDo(answer: GroundingAnswer, remedy: string): string {
  if (answer === 'yes') return 'Nothing'
  return answer === 'no' ? remedy : 'Ask for the layer or the view that shows it'
}
