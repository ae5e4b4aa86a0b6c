import { Caution } from '../ui/caution'
import { NoteList } from './note-list'

/** The cautions of one or several methods, each once; nothing where there are none. */
export const MethodCaution = ({ cautions }: { readonly cautions: readonly string[] }) =>
  cautions.length === 0 ? null : (
    <Caution title="Before you touch the board">
      <NoteList notes={[...new Set(cautions)]} />
    </Caution>
  )
