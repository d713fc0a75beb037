package soakline.window.present;

import soakline.problem.Code;
import soakline.problem.Finding;
import soakline.specimen.Edges;
import soakline.specimen.Facts;
import soakline.specimen.Run;
import soakline.wording.Wording;

/**
 * Which facts of a coupon the file did not say.
 *
 * @param several whether the file has other coupons that lack facts too
 */
public record Question(String coupon, boolean thickness, boolean faces, boolean size, boolean several) {

    /** What is missing of a run. */
    public static Question about(Run run, boolean several) {
        Facts facts = run.facts();
        boolean bare = facts.edges().filter(e -> e == Edges.BARE).isPresent();
        boolean sizeMissing = facts.width().isEmpty() || facts.length().isEmpty();
        return new Question(
                run.name(), facts.thickness().isEmpty(), facts.faces().isEmpty(), bare && sizeMissing, several);
    }

    public boolean isEmpty() {
        return !thickness && !faces && !size;
    }

    public String introduction() {
        return Wording.text(Finding.of(Code.ASK_FACTS));
    }

    public String thicknessHelp() {
        return Wording.text(Finding.of(Code.ASK_THICKNESS));
    }

    public String facesHelp() {
        return Wording.text(Finding.of(Code.ASK_FACES));
    }

    public String sizeHelp() {
        return Wording.text(Finding.of(Code.ASK_SIZE));
    }
}
