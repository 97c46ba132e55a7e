import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Menu, type MenuEntry } from '@/components/menu.tsx';
import { initials } from '@/lib/short-name.ts';
import { useRole, useSession } from '@/lib/session.ts';
import { chooseTheme, type ThemeChoice, useTheme } from '@/lib/theme.ts';
import { SignOutDialog } from './sign-out-dialog.tsx';
import { CELL, CellFace, PRESSABLE } from './title-cell.tsx';

const THEMES: readonly { choice: ThemeChoice; words: string }[] = [
  { choice: 'light', words: 'Light sheet' },
  { choice: 'dark', words: 'Dark sheet' },
  { choice: 'system', words: 'Sheet as the system' },
];

/** Who is signed in and as what; the theme and the way out. */
export function AccountCell() {
  const user = useSession((state) => state.user);
  const workshops = useSession((state) => state.workshops);
  const { workshopId } = useParams();
  const role = useRole(workshopId);
  const theme = useTheme((state) => state.choice);
  const [leaving, setLeaving] = useState(false);
  if (user === null) return null;
  const entries: MenuEntry[] = [
    { id: 'account', words: 'Your account', to: '/account' },
    ...(workshops.length > 1
      ? workshops.map((workshop) => ({
          id: workshop.id,
          words: workshop.name,
          detail: workshop.role,
          to: `/w/${workshop.id}`,
          chosen: workshop.id === workshopId ? true : undefined,
        }))
      : []),
    ...THEMES.map((entry) => ({
      id: entry.choice,
      words: entry.words,
      chosen: entry.choice === theme,
      onPress: () => chooseTheme(entry.choice),
    })),
    { id: 'sign-out', words: 'Sign out', onPress: () => setLeaving(true) },
  ];
  const described = role === null ? user.name : `${user.name}, ${role}`;
  return (
    <div data-fixed className="flex min-w-0 border-l border-rule max-tablet:shrink-0">
      <Menu
        name={`Signed in: ${described}, menu`}
        button={
          <>
            <span className="block max-tablet:hidden">
              <CellFace label="Signed in" value={described} />
            </span>
            <span className="hidden size-8 items-center justify-center border border-rule-strong text-xs font-semibold max-tablet:flex">
              {initials(user.name)}
            </span>
          </>
        }
        buttonClassName={`${CELL} ${PRESSABLE}`}
        side="end"
        entries={entries}
      />
      <SignOutDialog open={leaving} onClose={() => setLeaving(false)} />
    </div>
  );
}
