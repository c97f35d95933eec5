/** Why a unit as described cannot exist, by the reason code of the profile. */
export const variantProblems = {
  "standing-pilot-needs-natural-draft":
    "A standing pilot comes with natural draft. Check ignition and draft.",
  "standing-pilot-needs-conventional": "A standing pilot comes with a conventional valve. Check the control.",
  "conventional-has-no-electronic-ignition":
    "A conventional valve has no electronic ignition. Check ignition and control.",
  "direct-ignition-needs-induced-draft": "Direct ignition comes with an inducer. Check ignition and draft.",
  "valve-mounted-control-lights-a-pilot":
    "A control on the gas valve lights a pilot. Check ignition and control.",
  "hot-surface-direct-needs-board": "Hot surface lighting the burner comes with a board. Check the control.",
  "modulating-needs-board": "A modulating unit has an integrated board. Check stages and control.",
  "natural-draft-is-one-stage": "Natural draft comes with one stage. Check draft and stages.",
  "condensing-is-not-rooftop": "Condensing units are not on a roof here. Check draft and location.",
  "condensing-needs-board": "A condensing unit has an integrated board. Check draft and control.",
  "one-blower-kind": "A blower is either electronic or has a capacitor. Choose one.",
  "vent-damper-needs-natural-draft": "A vent damper comes with natural draft. Check draft and options.",
  "least-above-most": "The least is above the most. Read the plate again.",
} as const;
