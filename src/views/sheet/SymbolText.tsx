/** A symbol in formula notation, 'ρ_1', with its subscript set low. */
export function SymbolText({ text }: { readonly text: string }) {
  const [base, subscript] = text.split('_');
  return (
    <i>
      {base}
      {subscript && <sub>{subscript}</sub>}
    </i>
  );
}
