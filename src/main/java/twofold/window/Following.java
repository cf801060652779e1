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

    /** Chooses. */
    public void choose(Follow follow) {
        chosen = Optional.of(follow);
    }

    /** Chooses the next that the plan allows. */
    public void next() {
        List<Follow> allowed = allowed();
        choose(allowed.get((allowed.indexOf(now()) + 1) % allowed.size()));
    }
}
