import { commands, shortcutName } from '../model/commands'

/** Every key of the editor, made of the commands themselves. */
export function KeysList() {
  return (
    <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-2">
      {commands.map(({ name, shortcuts }) => (
        <div key={name} className="contents">
          <dt className="figures text-right font-medium">{shortcuts.map(shortcutName).join(' or ')}</dt>
          <dd>{name}</dd>
        </div>
      ))}
    </dl>
  )
}
