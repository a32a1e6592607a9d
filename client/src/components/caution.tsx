/** The product's caution, wherever its numbers or texts could be taken for more than they are. */
export function Caution() {
  return (
    <p className="caution">
      Supports a panel’s discussion. It is not a diagnosis and replaces no clinical judgement, local policy,
      licensed practice or emergency care.
    </p>
  );
}

/** On the referral form, before anybody waits for a conference. */
export function EmergencyCaution() {
  return <p className="note">In an emergency call the emergency services. Do not wait for a conference.</p>;
}
