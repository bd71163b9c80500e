import { CheckField, InputField, SelectField, TextareaField } from '@/components/ui/field'
import { Fold } from '@/components/ui/fold'
import { ProvenanceKey } from '@/components/ui/provenance'
import { Section } from '@/components/ui/section'
import { ChannelChip } from '@/components/ui/channel-chip'

const kinds = [{ value: 'fixed', label: 'fixed' }, { value: 'mechanical', label: 'mechanical' }, { value: 'table', label: 'table of speed' }]

export function FieldPieces() {
  return (
    <>
      <Section title="Field">
        <SelectField label="Advance by" source="typed" choices={kinds} defaultValue="table" name="pieces-kind" />
        <InputField label="From 2200 rpm" unit="degrees" source="typed" defaultValue="29.4" />
        <InputField label="Hotter charge to allow for" unit="K" source="default" defaultValue="20" />
        <InputField label="Bore" unit="mm" source="sheet" defaultValue="90.0" />
        <InputField label="Damper diameter, typed with its own unit" unit="mm" source="typed" defaultValue="6.5 in" note="6.5 in is 165.1 mm. Leave the field and it reads 165.1." />
        <InputField label="From 2200 rpm" unit="degrees" source="typed" defaultValue="29.4" flagged note="Flagged: this input drives a finding that is outside." />
        <InputField label="Crank retard below" unit="rpm" source="typed" defaultValue="1400" error="At least 50 rpm below the slowest idle, 600 rpm, or A stays retarded on the ground." />
        <InputField label="Best-torque timing (MBT)" unit="degrees" source="measured" defaultValue="36.0" note="own dynamometer, parabola through 5 points, ±0.7°" error="Two things at once: −20 to 60 degrees." />
        <InputField label="Secondary capacitance of leads, cap and plug together, measured with the longest lead fitted" unit="pF" source="measured" defaultValue="85" />
        <InputField label="Wall temperature, fixed in a released plan" unit="K" source="solved" defaultValue="470" locked />
        <InputField layout="broad" label="Name" source="typed" defaultValue="Climb timing" />
        <TextareaField label="Notes" source="typed" defaultValue={'Plate re-cut to 24 mm.\nCheck the rotor at the next annual.'} />
        <CheckField label="The damper end carries the mark" defaultChecked />
        <CheckField label="One channel selected at a time" note="Otherwise both fire on every cycle." />
        <ProvenanceKey />
      </Section>
      <Section title="Folds">
        <Fold title="Engine" summary="flat six, 2.6 litres, 90 × 68 mm"><InputField label="Bore" unit="mm" source="sheet" defaultValue="90.0" /></Fold>
        <Fold title={<><ChannelChip channel="A" /> Primary channel</>} summary="fixed 26.5°" open><InputField label="Advance" unit="degrees" source="typed" defaultValue="26.5" /></Fold>
        <Fold title={<><ChannelChip channel="B" /> Backup channel</>} summary="fixed 17.0°"><InputField label="Advance" unit="degrees" source="typed" defaultValue="17.0" /></Fold>
      </Section>
    </>
  )
}
