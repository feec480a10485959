let last = 0;

/** A number not given before in this test file, for names and addresses that must differ. */
export function nextNumber(): number {
  last += 1;
  return last;
}
