/** Least length of a password, in characters: long ones need no rules about digits and signs. */
export const leastPasswordLength = 12;

type Owner = { readonly name: string; readonly mail: string };

/**
 * What is wrong with a password its owner chose, as a sentence; null when it may be taken. It is at least 12 characters
 * long, of at least 5 different ones, and holds neither the owner's mail address nor a part of the name.
 */
export function passwordFault(password: string, owner: Owner): string | null {
  const typed = password.normalize('NFKC').toLowerCase();
  const characters = [...typed];
  if (characters.length < leastPasswordLength)
    return `A password has at least ${leastPasswordLength} characters; this one has ${characters.length}.`;
  if (new Set(characters).size < 5) return 'This password repeats too few characters; use at least 5 different ones.';
  if (ownWords(owner).some((word) => typed.includes(word)))
    return 'This password holds your name or mail address; choose one that does not.';
  return null;
}

// Words of three letters or fewer turn up in good passwords by chance.
const leastWord = 4;

function ownWords({ name, mail }: Owner): string[] {
  const [box = ''] = mail.split('@');
  return [mail, box, ...box.split(/[._+-]/), ...name.split(/[\s.'-]+/)]
    .map((word) => word.normalize('NFKC').toLowerCase())
    .filter((word) => [...word].length >= leastWord);
}
