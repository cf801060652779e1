package twofold.picture;

import java.util.Locale;

/**
 * The named colours, each with its value in either theme: the one source of colours, for drawings and for the window's
 * style sheet. Which ink may stand on what is listed, and computed, in {@code ContrastTest}.
 */
public enum Ink {
    /** Behind drawings and lists. */
    PAPER(0xffffff, 0x161d22),
    /** Behind panes. */
    DESK(0xeef2f4, 0x0f1417),
    /** Menu bar and status line. */
    BAR(0xe2e8ea, 0x1f282e),
    /** Text. */
    TEXT(0x1e2b34, 0xe4ebef),
    /** Text of less weight: units, notes, axis numbers. */
    QUIET(0x55636d, 0xa3b3bd),
    /** Frames and rules that carry no meaning. */
    RULE(0xd5dde1, 0x323e46),
    /** The table's holes; carries no meaning by itself. */
    HOLE(0xc3d0d8, 0x3c4b55),
    /** The beam's axis, radius axes, scale bars. */
    AXIS(0x43525c, 0xb4c2cb),
    /** The tangential plane, always with a solid line or /// too. */
    TANGENTIAL(0x0a766c, 0x4ec4b6),
    /** The sagittal plane, always with a dashed line or \\\ too. */
    SAGITTAL(0x955600, 0xeeae4c),
    /** Bodies of mirrors. */
    OPTIC(0xb9c8d3, 0x4a5b68),
    /** Outlines of mirrors, lenses, stops and black boxes. */
    OPTIC_EDGE(0x33475a, 0xa9bccb),
    /** Mounts. */
    MOUNT(0xecf1f3, 0x273139),
    /** Outlines of mounts. */
    MOUNT_EDGE(0x84939d, 0x6f808c),
    /** Bodies of crystals. */
    CRYSTAL(0xf7d0df, 0x6b2f49),
    /** Outlines and names of crystals. */
    CRYSTAL_EDGE(0xa12a5c, 0xf08db4),
    /** Bodies of plates and lenses. */
    GLASS(0xc5def2, 0x2c4a66),
    /** The selected part, always with a frame too. */
    SELECTED(0x1d4fa8, 0x8db8ff),
    /** The crosshair and its tie. */
    CROSSHAIR(0x5b3aa6, 0xc3acff),
    /** What is wrong, always with words or a sign too. */
    BAD(0xb3201f, 0xff8f86),
    /** What is right, always with words or a sign too. */
    GOOD(0x24713f, 0x74cf93),
    /** Behind a control. */
    CONTROL(0xf5f8f9, 0x232d34),
    /** Behind a control under the pointer. */
    CONTROL_HOVER(0xe6edf0, 0x2e3a42),
    /** Outlines of controls. */
    CONTROL_EDGE(0x7a8a94, 0x74858f),
    /** The one control that matters most. */
    ACCENT(0x0a766c, 0x4ec4b6),
    /** Text on it. */
    ON_ACCENT(0xffffff, 0x0b1a1c),
    /** Behind the selected row of a list. */
    SELECTED_ROW(0xdbe7fb, 0x24395c),
    /** The frame round what has the keyboard. */
    FOCUS(0x1d4fa8, 0x8db8ff);

    private final int light;
    private final int dark;

    Ink(int light, int dark) {
        this.light = light;
        this.dark = dark;
    }

    /** The value in the light theme, 0xRRGGBB. */
    int light() {
        return light;
    }

    /** The value in the dark theme, 0xRRGGBB. */
    int dark() {
        return dark;
    }

    /** The name in a style sheet: lower case, with hyphens. */
    public String token() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
