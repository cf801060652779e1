package twofold.window;

import java.util.List;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.layout.Follow;
import twofold.session.Session;

/** What else moves when a mirror is moved: the person's choice, as far as the plan allows it, else the usual. */
public final class Following {
    private final Session session;
    private Optional<Follow> chosen = Optional.empty();
    private Runnable listener = () -> {};

    Following(Session session) {
        this.session = session;
    }

    /** What the plan allows, the usual first. */
    public List<Follow> allowed() {
        return session.shown().cavity().map(Cavity::laid).map(Follow::allowed).orElse(List.of(Follow.OTHERS_STAY));
    }

    /** What follows now. */
    public Follow now() {
        List<Follow> allowed = allowed();
        return chosen.filter(allowed::contains).orElse(allowed.get(0));
    }

    /** What the person chose, if the plan allows it; else a typed leg or incidence moves mirrors in its own usual way. */
    public Optional<Follow> chosen() {
        return chosen.filter(allowed()::contains);
    }

    /** Chooses. */
    public void choose(Follow follow) {
        choose(Optional.of(follow));
    }

    /** Chooses, or leaves it to what is usual. */
    public void choose(Optional<Follow> follow) {
        chosen = follow;
        listener.run();
    }

    /** Is told of every choice. */
    public void onChoice(Runnable told) {
        listener = told;
    }

    /** Chooses the next that the plan allows. */
    public void next() {
        List<Follow> allowed = allowed();
        choose(allowed.get((allowed.indexOf(now()) + 1) % allowed.size()));
    }
}
