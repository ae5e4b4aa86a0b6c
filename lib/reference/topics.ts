import type { Topics } from './topic'
import { filterTopics } from './topics/filter'
import { captureTopics } from './topics/capture'
import { emissionTopics } from './topics/emission'
import { limitsTopics } from './topics/limits'
import { lineTopics } from './topics/line'
import { loopTopics } from './topics/loop'
import { partsTopics } from './topics/parts'
import { receiverTopics } from './topics/receiver'
import { shieldingTopics } from './topics/shielding'
import { snubberTopics } from './topics/snubber'
import { spectrumTopics } from './topics/spectrum'
import { viaTopics } from './topics/via'

/** Every topic that reference cases may be about. */
export const topics: Topics = {
  ...snubberTopics,
  ...partsTopics,
  ...spectrumTopics,
  ...receiverTopics,
  ...limitsTopics,
  ...loopTopics,
  ...lineTopics,
  ...viaTopics,
  ...emissionTopics,
  ...shieldingTopics,
  ...filterTopics,
  ...captureTopics,
}
