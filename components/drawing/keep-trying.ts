/** Often enough to be there when the connection is, seldom enough to be no burden. */
const AGAIN_MS = 2000;
/** With a connection, a part that fails so often is not there: a newer version has been installed. */
const MOST_REFUSALS = 5;

/**
 * A part of the program, fetched however long it takes. Without this a connection lost just after
 * opening would take the whole drawing off the screen, with what is on it. Throws what the last
 * attempt threw where there is a connection and the part still does not come.
 */
export async function keepTrying<Part>(load: () => Promise<Part>): Promise<Part> {
  for (let refusals = 0; ;) {
    try {
      return await load();
    } catch (error) {
      if (navigator.onLine) refusals++;
      if (refusals >= MOST_REFUSALS) throw error;
      await new Promise((done) => setTimeout(done, AGAIN_MS));
    }
  }
}
