import { openEngagement } from '@/lib/domain/engagements/engagement.service'

import type { DemoScene } from './scene'

/** The rail sensor's brief, which waits for a consultant. */
export async function playLarkfield(scene: DemoScene): Promise<void> {
  await scene.as('otherPurchaser', openEngagement, {
    companyId: scene.ids.companies.larkfield,
    title: 'Flyback clamp runs hot',
    product: 'Track sensor supply LRS-3, 24 V to 5 V flyback (demo)',
    symptom:
      'The clamp resistor reaches 118 °C at full load; its neighbour, a film capacitor, is rated for 105 °C.',
    alreadyTried: 'A larger clamp capacitor: no change in temperature.',
    vin: '24',
    vout: '5',
    iout: '2',
    switchingFrequency: '130k',
  })
}
