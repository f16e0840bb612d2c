import '../../components/form/form.css';

/** What must be said to somebody who reads this on a roof. */
export function ClimbCaution() {
  return (
    <aside class="caution small" aria-label="Caution">
      <p>
        <strong>Read this standing still, and put the phone away before you climb.</strong> On the ladder keep
        three points of contact and face it. Nothing on this list is worth a hurried step, a wet roof or a
        gust; the rules for work at height that hold where you are come first.
      </p>
    </aside>
  );
}
