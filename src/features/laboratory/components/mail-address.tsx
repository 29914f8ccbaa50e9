/** A mail address that breaks after its @ where the line is too short, and only there unless it must elsewhere. */
export function MailAddress({ address }: { address: string }) {
  const at = address.indexOf('@') + 1;
  return (
    <span className="[overflow-wrap:anywhere]">
      {address.slice(0, at)}
      <wbr />
      {address.slice(at)}
    </span>
  );
}
