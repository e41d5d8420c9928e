import { Popover } from 'radix-ui';
import { Button } from '../../../components/button.tsx';
import { chooseTheme, useThemeChoice, type ThemeChoice } from '../../../lib/theme.ts';
import { useSignOut, type Person } from '../api/session.ts';

const THEMES: readonly (readonly [ThemeChoice, string])[] = [['system', 'As the system'], ['paper', 'Paper'], ['blueprint', 'Blueprint']];

export function AccountMenu({ person }: { person: Person }) {
  const theme = useThemeChoice();
  const signOut = useSignOut();
  return (
    <Popover.Root>
      <Popover.Trigger className="min-h-10 cursor-pointer px-1 underline decoration-rule underline-offset-4 hover:text-accent"><span className="sm:hidden">{person.name.split(' ')[0]}</span><span className="hidden sm:inline">{person.name}</span></Popover.Trigger>
      <Popover.Content align="end" sideOffset={6} className="z-10 w-72 border border-rule bg-sheet p-4">
        <p className="font-semibold">{person.name}</p>
        <p className="break-words text-soft">{person.email}<br />{person.role}</p>
        <fieldset className="my-4">
          <legend className="lettering mb-1 text-soft">Theme</legend>
          {THEMES.map(([choice, label]) => (
            <label key={choice} className="flex min-h-8 items-center gap-2">
              <input type="radio" name="theme" className="accent-accent" checked={theme === choice} onChange={() => chooseTheme(choice)} />{label}
            </label>
          ))}
        </fieldset>
        <Button className="w-full" busy={signOut.isPending} onClick={() => signOut.mutate()}>Sign out</Button>
      </Popover.Content>
    </Popover.Root>
  );
}
