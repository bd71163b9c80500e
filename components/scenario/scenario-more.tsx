interface ScenarioMoreProps {
  id: string
  archived: boolean
  canArchive: boolean
  duplicate: (form: FormData) => Promise<void>
  archive: (form: FormData) => Promise<void>
  restore: (form: FormData) => Promise<void>
}

function OneButton({ id, action, label }: { id: string, action: (form: FormData) => Promise<void>, label: string }) {
  return (
    <form action={action}>
      <input type="hidden" name="id" value={id} />
      <button type="submit" className="link">{label}</button>
    </form>
  )
}

/** What is done with a whole scenario. */
export function ScenarioMore({ id, archived, canArchive, duplicate, archive, restore }: ScenarioMoreProps) {
  return (
    <span className="more">
      <OneButton id={id} action={duplicate} label="Duplicate" />
      {canArchive ? archived ? <OneButton id={id} action={restore} label="Restore" /> : <OneButton id={id} action={archive} label="Archive" /> : null}
    </span>
  )
}
