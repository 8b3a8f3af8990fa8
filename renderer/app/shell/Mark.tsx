/** Five d orbitals in an octahedral field: two levels above three. */
export function Mark() {
  return (
    <svg className="mark" viewBox="0 0 26 20" width="26" height="20" aria-hidden="true">
      <path d="M4 5h7M15 5h7" />
      <path d="M0.5 15h7M9.5 15h7M18.5 15h7" />
    </svg>
  );
}
