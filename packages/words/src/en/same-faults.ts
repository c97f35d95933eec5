/** When two names mean one fault. */
export const sameFaults = {
  always: "These are two names of one fault.",
  "rollout-tripped-burners-dirty": "The rollout was found tripped and the burners dirty.",
  "rollout-tripped-inlet-low": "The rollout was found tripped and the inlet low.",
  "one-blocked-vent": "One blocked vent, whichever device caught it.",
  "blockage-is-nest-or-ice": "The blockage is the nest, or the ice.",
  "one-leg-fuse-blown": "One leg's fuse is blown in the disconnect.",
  "input-above-plate": "Input above the plate: the cause of the overfire is meant.",
  "falls-while-others-run": "The pressure falls only while other appliances run.",
  "regulator-is-the-cause": "The propane regulator is the cause.",
  "own-cock-shut-for-season": "The unit's own cock was shut for the season.",
  "contact-is-the-pumps": "The open contact is the pump's.",
  "control-holds-cooling": "The building control is what holds cooling.",
} as const;
