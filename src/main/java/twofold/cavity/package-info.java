/**
 * The two chains of a laid-out design, and what they answer.
 *
 * <p>{@link twofold.cavity.Chain} is the topology: kinds, order, slots; immutable and shared. A
 * {@link twofold.cavity.Trial} holds every number of a chain and walks both planes at once, without allocating; reports,
 * pictures and studies all run it, there is no second version of the optics. {@link twofold.cavity.Cavity#solve} runs one
 * trial and copies what it says into records.
 *
 * <p>An unstable plane is an answer: it has a half trace, a round trip and a magnification, and no beam. A plane is on the
 * edge when 1 − |half trace| is not above the rounding of its chain; {@link twofold.cavity.Trial#state} says how that is
 * bounded.
 */
package twofold.cavity;
