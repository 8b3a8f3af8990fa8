import { Dialog, Keys } from '../../parts';
import { type Command, shownCombo, useAllCommands } from '../commands';
import './ShortcutList.css';

interface ShortcutListProps {
  readonly open: boolean;
  readonly onClose: () => void;
}

/** What the keyboard can do here and now, grouped. */
export function ShortcutList({ open, onClose }: ShortcutListProps) {
  const commands = useAllCommands();
  return (
    <Dialog open={open} title="Keyboard shortcuts" onClose={onClose} wide>
      <div className="shortcut-groups">
        {groupsOf(commands).map(([group, members]) => (
          <section key={group}>
            <h3>{group}</h3>
            <dl>
              {members.map((command) => (
                <div key={command.id}>
                  <dt>{command.label}</dt>
                  <dd>
                    {command.keys!.map((keys, index) => (
                      <span key={keys}>
                        {index > 0 && <span className="soft"> or </span>}
                        <Keys combo={shownCombo(keys)} />
                      </span>
                    ))}
                  </dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
      </div>
      <p className="soft small">Single letters can be switched off in the settings.</p>
    </Dialog>
  );
}

function groupsOf(commands: readonly Command[]): [string, Command[]][] {
  const groups = new Map<string, Command[]>();
  const seen = new Set<string>();
  for (const command of commands) {
    if (!command.keys?.length || seen.has(command.id)) continue;
    seen.add(command.id);
    groups.set(command.group, [...(groups.get(command.group) ?? []), command]);
  }
  return [...groups];
}
