import { useDroppable } from '@dnd-kit/core';
import { useId, useState, type ReactNode } from 'react';
import { IconButton } from '@/components/button';
import { MoreIcon } from '@/components/icons';
import { Menu, MenuItem, MenuRule } from '@/components/menu';
import { NameDialog } from '@/components/name-dialog';
import { useDeletePile, useUpdatePile } from '../api/print-mutations';
import { LOOSE } from '../hooks/use-pile-drag';
import type { PileGroup } from '../model/pile-groups';

interface PileSectionProps {
  readonly studioId: string;
  readonly group: PileGroup;
  readonly isEditable: boolean;
  /** What stands at the right of the name. */
  readonly action?: ReactNode;
  readonly onFail: (error: unknown) => void;
  readonly children: ReactNode;
}

/** A pile: its name and count, and the prints in it. */
export function PileSection({ studioId, group, isEditable, action, onFail, children }: PileSectionProps) {
  const { setNodeRef, isOver } = useDroppable({ id: group.id ?? LOOSE });
  const headingId = useId();
  const [isNaming, setIsNaming] = useState(false);
  const update = useUpdatePile(studioId);
  const remove = useDeletePile(studioId);
  const { id, name, sharedWithContributors } = group;
  return (
    <section ref={setNodeRef} className="pile-section" data-over={isOver} aria-labelledby={headingId}>
      <div className="flex items-center gap-[10px] border-b border-rule pb-1">
        <h2 id={headingId} className="min-w-0 truncate">
          {name}
        </h2>
        <span className="num text-12 text-ink-2">{group.prints.length}</span>
        {sharedWithContributors && (
          <span className="text-12 text-ink-2" title="Contributors may add to this pile">
            shared
          </span>
        )}
        <span className="ml-auto flex items-center gap-1">
          {action}
          {id !== null && isEditable && (
            <Menu
              align="end"
              trigger={
                <IconButton label={`More for the pile ${name}`} className="-my-1">
                  <MoreIcon />
                </IconButton>
              }
            >
              <MenuItem onSelect={() => setIsNaming(true)}>Rename pile</MenuItem>
              <MenuItem onSelect={() => update.mutate({ id, sharedWithContributors: !sharedWithContributors }, { onError: onFail })}>
                {sharedWithContributors ? 'Stop sharing with contributors' : 'Share with contributors'}
              </MenuItem>
              <MenuRule />
              <MenuItem onSelect={() => remove.mutate(id, { onError: onFail })}>Break up the pile</MenuItem>
            </Menu>
          )}
        </span>
      </div>
      <ul className="pile-lay">
        {children}
        {group.prints.length === 0 && <li className="emptyline w-full">{id === null ? 'Nothing lies loose.' : 'Empty: drag prints here.'}</li>}
      </ul>
      {isNaming && id !== null && (
        <NameDialog
          title="Rename pile"
          label="Name"
          action="Rename"
          initial={name}
          maxLength={80}
          onClose={() => setIsNaming(false)}
          onSave={(newName) => update.mutateAsync({ id, name: newName })}
        />
      )}
    </section>
  );
}
