import { Caution } from '@/components/ui/caution'

/** At the head: what the figures are, and what they are not. */
export function ModelCaution() {
  return <Caution lead="The models compare settings of one engine; they clear none for flight.">Detonation can destroy an engine in seconds. Ground-run, then flight-test as the rules of your country and licensed practice say. A condition inspection and its record are made by the person those rules name; this page is a help for that record.</Caution>
}

/** Before the figures that are tried with the engine running. */
export function RunningCaution() {
  return <Caution lead="Beside a running engine:">chocks and brake, a second person at the controls, stay out of the propeller’s plane, nothing loose. A propeller is live whenever any ignition could fire. Nobody shuts a cylinder or a channel off in flight to see what is left.</Caution>
}

/** Before what is set with hands on the ignition. */
export function FittingCaution() {
  return <Caution lead="Secondary voltage can injure or kill.">Ignition off and supply disconnected before hands go in.</Caution>
}
