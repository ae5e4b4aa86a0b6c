import { Caution } from '../ui/caution'

export const ProbingCaution = () => (
  <Caution title="Before you probe again">
    <ul>
      <li>
        Switch nodes and circuits tied to the mains can injure: use a differential or isolated probe, never
        float the oscilloscope, and let qualified people measure.
      </li>
      <li>Switch off, wait, and check that capacitors are discharged before you touch the board.</li>
      <li>Snubber resistors and clamp parts run hot. Local codes and your own safety rules come first.</li>
    </ul>
  </Caution>
)
