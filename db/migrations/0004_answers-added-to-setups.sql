-- Setups of before hold inputs without the fields that came with tapers; unanswered they mean what they meant.
UPDATE "setups" SET "inputs" = "inputs" || jsonb_build_object(
  'work', '{"taperSide": "outside", "taperMethod": "compound", "taperGiven": "angle", "includedAngleDeg": null,
    "smallDiameterMm": null, "taperPerLength": null, "shoulders": "none", "warmerK": null, "headEndMm": null,
    "tailEndMm": null, "endsApartMm": null}'::jsonb || ("inputs" -> 'work'),
  'machine', '{"belowCentreMm": null}'::jsonb || ("inputs" -> 'machine'),
  'cut', '{"softnessPerMm": null}'::jsonb || ("inputs" -> 'cut'));
--> statement-breakpoint
UPDATE "shops" SET "rules" = '{"roughDressDepthMm": 0.025, "finishDressDepthMm": 0.0125, "roughDressPasses": 3,
  "finishDressPasses": 2, "speedRatioLow": 40, "speedRatioHigh": 120, "steelExpansionPerK": 0.0000115}'::jsonb || "rules";
