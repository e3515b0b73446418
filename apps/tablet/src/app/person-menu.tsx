import { useUnfinished } from '@windrow/client/writes/drafts';
import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { Menu, MenuItem, MenuLabel, MenuLine, MenuLink } from '@windrow/ui/controls/menu';
import type { Session } from '@windrow/ventilation/contract/session';
import { Check } from 'lucide-react';
import { useCallback, useState } from 'react';
import { Link } from 'react-router-dom';
import type { NavLinkTo } from './nav-links.ts';
import { chooseTheme, type ThemeChoice, useThemeChoice } from './theme.ts';
import { useSignOut } from './use-sign-out.ts';

const THEMES: readonly { value: ThemeChoice; label: string }[] = [
  { value: 'unit', label: "By the unit's hours" },
  { value: 'night', label: 'Night' },
  { value: 'day', label: 'Day' },
];

/** Who is signed in, the theme, and the way out; on narrow screens also the parts of Windrow. */
export function PersonMenu({ session, links }: { session: Session; links: readonly NavLinkTo[] }) {
  const { person } = session;
  const theme = useThemeChoice();
  const unfinished = useUnfinished().length;
  const { leave, fault, forget } = useSignOut();
  const [isAsking, setAsking] = useState(false);
  const signOut = () => (unfinished > 0 ? setAsking(true) : void leave());
  const stay = useCallback(() => {
    setAsking(false);
    forget();
  }, [forget]);

  return (
    <>
      <Menu
        label="Menu"
        trigger={
          <Button tone="quiet" aria-label={`Menu of ${person.displayName}`}>
            {person.initials}
          </Button>
        }
      >
        <MenuLabel>{person.displayName}</MenuLabel>
        <div className="flex flex-col md:hidden">
          {links.map(({ to, label }) => (
            <MenuLink key={to}>
              <Link to={to}>{label}</Link>
            </MenuLink>
          ))}
          <MenuLine />
        </div>
        <MenuLabel>Light</MenuLabel>
        {THEMES.map(({ value, label }) => (
          <MenuItem key={value} onSelect={() => chooseTheme(value)}>
            <span className="grow">{label}</span>
            {theme === value && <Check aria-label="chosen" />}
          </MenuItem>
        ))}
        <MenuLine />
        <MenuLink>
          <Link to="/notes">Method notes</Link>
        </MenuLink>
        <MenuItem onSelect={signOut}>Sign out</MenuItem>
      </Menu>
      <Dialog
        open={isAsking || fault !== null}
        onClose={stay}
        title={fault === null ? 'Sign out and lose what was typed?' : 'Not signed out'}
        description={
          fault ?? `${unfinished === 1 ? 'One entry is' : `${unfinished} entries are`} not recorded yet.`
        }
      >
        <DialogActions>
          <Button tone="main" onClick={() => void leave()}>
            {fault === null ? 'Sign out' : 'Try again'}
          </Button>
          <Button onClick={stay}>Stay</Button>
        </DialogActions>
      </Dialog>
    </>
  );
}
