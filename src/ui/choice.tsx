import { CheckIcon } from '@phosphor-icons/react/dist/csr/Check';
import { DropdownMenu } from 'radix-ui';

export type ChoiceOption = { value: string; words: string };

type ChoiceProps = {
  /** What is chosen, for a screen reader: "State". */
  label: string;
  value: string;
  options: readonly ChoiceOption[];
  onChosen: (value: string) => void;
};

/** A dotted-underlined choice inside a sentence: "Show *every state* held by *anyone*". */
export function Choice({ label, value, options, onChosen }: ChoiceProps) {
  const words = options.find((option) => option.value === value)?.words ?? value;
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger className="choice" aria-label={`${label}: ${words}`}>
        {words}
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content className="menu" align="start" sideOffset={6} collisionPadding={8}>
          <DropdownMenu.RadioGroup value={value} onValueChange={onChosen}>
            {options.map((option) => (
              <DropdownMenu.RadioItem key={option.value} value={option.value} className="menu-entry">
                <span className="w-[14px]">
                  <DropdownMenu.ItemIndicator>
                    <CheckIcon size={14} aria-hidden />
                  </DropdownMenu.ItemIndicator>
                </span>
                {option.words}
              </DropdownMenu.RadioItem>
            ))}
          </DropdownMenu.RadioGroup>
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}
