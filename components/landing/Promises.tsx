export function Promises() {
  return (
    <section aria-labelledby="promises" className="basted grid gap-5 pt-6">
      <h2 id="promises" className="text-lg">
        Your photos
      </h2>
      <p className="max-w-prose">
        Photos of bodies in half-sewn clothes are the most private thing here. Nobody sees yours but you.
        Place and camera data are removed before a photo is kept. No page here opens them to whoever runs the
        site.
      </p>
      <p className="max-w-prose text-graphite">
        Ruckle fits clothes to people. It is no medical advice, and not for compression, medical or protective
        clothing: follow their maker and standard. Something that hurts, numbs or takes your breath comes off
        at once.
      </p>
    </section>
  );
}
