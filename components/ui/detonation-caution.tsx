import { detonationLead, detonationRest } from '@/lib/words/detonation-words'
import { Caution } from './caution'

/** Stands wherever a margin to detonation is shown. */
export function DetonationCaution() {
  return <Caution lead={detonationLead}>{detonationRest}</Caution>
}
