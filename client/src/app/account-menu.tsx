import { DropdownMenu } from '@radix-ui/themes';
import type { Me } from '@weighhouse/shared/contracts/people';
import { Link } from 'react-router-dom';
import { useSignOut } from '../features/people/api/sign-out';
import { chooseTheme, type ThemeChoice, useThemeChoice } from './theme-choice';

const choices: { value: ThemeChoice; label: string }[] = [
  { value: 'system', label: 'As the system' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
];

/** Whose page this is, with the theme, the account and signing out behind the name. */
export function AccountMenu({ me }: { me: Me }) {
  const theme = useThemeChoice();
  const signOut = useSignOut();
  return (
    <DropdownMenu.Root>
      <DropdownMenu.Trigger>
        <button type="button" className="account-button">
          <span className="account-name">
            {me.name}
            <span className="account-specialty">, {me.specialty}</span>
          </span>
          <span aria-hidden="true">▾</span>
        </button>
      </DropdownMenu.Trigger>
      <DropdownMenu.Content align="end" variant="soft" highContrast>
        <DropdownMenu.Item asChild>
          <Link to="/account">Your account</Link>
        </DropdownMenu.Item>
        <DropdownMenu.Separator />
        <DropdownMenu.Label>Colours</DropdownMenu.Label>
        <DropdownMenu.RadioGroup
          value={theme}
          onValueChange={(value) => {
            chooseTheme(value as ThemeChoice);
          }}
        >
          {choices.map((choice) => (
            <DropdownMenu.RadioItem key={choice.value} value={choice.value}>
              {choice.label}
            </DropdownMenu.RadioItem>
          ))}
        </DropdownMenu.RadioGroup>
        <DropdownMenu.Separator />
        <DropdownMenu.Item
          onSelect={() => {
            signOut.mutate({ everywhere: false });
          }}
        >
          Sign out
        </DropdownMenu.Item>
      </DropdownMenu.Content>
    </DropdownMenu.Root>
  );
}
