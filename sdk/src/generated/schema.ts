// Generated from openapi/openapi.json; `npm run generate` writes it anew.
export interface paths {
    "/v1/stability": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Whether ions or points (a, q) are stable, and which rods take them if not
         * @description Solves the Mathieu equation in both planes, or with a rectangular wave the Meissner equation, in which V is half the swing of the wave and a only the DC besides it. a and q belong to x, −a and −q to y. Beyond |a| or q of 100, under a rectangular wave also where rounding would show before, nothing is computed and reason says so. Stable means bounded for ever in an ideal field, not that the ion fits between the rods.
         */
        post: operations["stability"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/stability-regions": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * Corners and boundary curves of the stability regions; also as a diagram
         * @description The regions of the ideal mass filter under a sinusoid, in a box of (a, q). Region (n_x, n_y) is where a_{n_x}(q) < a < b_{n_x+1}(q) and a_{n_y}(q) < −a < b_{n_y+1}(q). Accept: image/svg+xml answers as a diagram to print.
         */
        get: operations["stabilityRegions"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/mathieu-parameters": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * a and q of an ion, and every quantity that follows from them
         * @description One relation in five directions, chosen by find: a = 8zeU/(m r0² Ω²) and q = 4zeV/(m r0² Ω²), U and V pole-to-ground, V zero-to-peak, Ω = 2πf.
         */
        post: operations["mathieuParameters"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/rf-only": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Which ions an RF-only rod set guides, and how firmly
         * @description Collision cells and ion guides of 2 to 11 pole pairs. q, stability, cutoff and secular frequency belong to the quadrupole; the effective potential and the adiabaticity hold for every rod set.
         */
        post: operations["rfOnly"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/transit": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * How long ions stay in the field, and the resolution that this allows
         * @description Flight time and RF cycles of each ion, and the resolution N²/h that N cycles can form, for h = 12.25 (N = 3.5 √R) and h = 20. Which height of the peak either constant belongs to depends on the beam.
         */
        post: operations["transit"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/trajectory": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * The path of one ion, where and when it is lost, and what stands on the rods
         * @description x(t) and y(t) of an ion in the ideal field, by exact propagators of the linear equation; the envelope; where and when it first reaches r0; the share of a cycle in which the rods are positive, their largest voltage against ground; on request field and force at a point. At most 20000 samples, a cycle counting as 10 at least. Nothing is computed beyond |a| or q of 100. An ion that is unstable is not lost at once, and a stable one can still be too large for the rods. x are the rods whose DC has the sign of the ion.
         */
        post: operations["trajectory"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/passband": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * The m/z that a mass filter lets through
         * @description Where the scan line a/q = 2U/V enters and leaves a stability region, exactly: the first unless the request names another. There the edge at low m/z is β_x = 1 (light ions are lost to the x rods), the edge at high m/z β_y = 0. Rods may run a sinusoid or a rectangular wave; a DC-coupled rectangular wave filters by its duty cycle alone. Real peaks are narrower or wider than the distance of the edges, by residence and beam.
         */
        post: operations["passband"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/set-points": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * The RF and DC, or the frequency, that give passbands of wanted position and width
         * @description The inverse of the passband, solved exactly: the passband of the calculated drive is centred on the m/z of the ion and as wide as asked, in the region asked for. A rectangular wave has set points in its first region, by volts or by frequency, with DC or by its duty cycle alone. Where residence and beam are given, a width may be taken at half or at a tenth of the height: with a sinusoid, in the first region, by volts. The edges that give this peak are then solved for and centred on the ion, and `passband` states them. Calculated volts are not settings to apply, and they may exceed any supply.
         */
        post: operations["setPoints"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/peak-profile": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * The share of a beam that passes against m/z, and position, height and widths of the peak
         * @description Transmission of an ideal quadrupole field with a hard aperture at r0, for a centred Gaussian beam and a residence. Deterministic: for each start phase of the RF the states that survive form polygons, whose measure is computed, and the mean over the phase is taken; the answer states the error bound that was reached. Widths at half and at a tenth of the height are those of this peak and differ from the distance of the stability edges. Not modelled: fringe fields, round rods, collisions, space charge, the exit and a beam off the axis, so that real peaks have tails that this one lacks. One request may ask for 25000 RF cycles of work: (number of points, and 36 more for the peak) times (RF cycles, 2.5-fold with a scan rate, plus 1/√accuracy, several times that for flights of a few cycles).
         */
        post: operations["peakProfile"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/scan-table": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Set points over a range, the straight line in their place, and the fastest scan
         * @description Exact set points at constant width or constant resolution; the straight lines U = slope · V − offset that fit them best, by least squares and by the least worst width, with the worst width that each really gives (light ions break it) and where it passes nothing; and the fastest scan rate for a permitted loss. Calculated volts are not settings to apply. As text/csv the rows alone.
         */
        post: operations["scanTable"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/drift-budget": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * What tolerances do to a window, what they may be, and when to tune again
         * @description First-order shifts of edges, centre and width by exact derivatives: m/z goes as the amplitude and as 1/(f r0)², and U/V moves the edges against each other. Causes are independent; the worst case adds them, the root-sum-square does not. Backwards, the tolerance each cause may have for a wanted limit. From successive tune records, how long the offset stays within a limit.
         */
        post: operations["driftBudget"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/mz-calibration": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Position and width of measured peaks as a line, what each peak pulls, and what to expect between
         * @description Weighted least squares of observed less set m/z and of the width, with standard uncertainties from the scatter of the residuals, leverage and Cook distance of each peak, prediction intervals (Student t at the stated confidence) and a mark on extrapolations; and, where volts are stated, the field radius that they imply. sigma weighs peaks against each other; the scatter sets the scale, and for one more peak the largest stated sigma counts.
         */
        post: operations["mzCalibration"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/sign-off": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Whether the mass-filter settings of a method can do what it claims, on paper
         * @description Instrument, method and, where the laboratory has limits of its own, criteria; findings, settings and a verdict come back. Nothing about the rods need be known: a finding that lacks an input is indeterminate and names it. A pass means that every check that counts met its limit, and verdictStatement says what was not shown; it never means that a method works. As text/html the answer is a report to print, with room for a person's signature. The record holds input and result with their digests, and a seal where the service was given a key; keep it, and post it to /v1/sign-off/verification whenever the question comes up whether it still holds. A JSON object that names a member twice is refused.
         */
        post: operations["signOff"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/sign-off/verification": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Whether a record still holds: unaltered, sealed, and the same found from the same input today
         * @description Answers four questions apart. Intact: whether the digests fit the content. Seal: whether a key that this service knows sealed this very content. Reproduced: whether this version finds the same from the input on record, every number within the stated tolerance; digests of two computations are never compared. Criteria: whether the method still meets the criteria on record, or those of the request. A record that was tampered with gets an answer, not a refusal. The public keys stand at /.well-known/jwks.json, so digests and seal can be checked without this service. If the private key is lost, old seals stay valid and new records are sealed with a new key, with the old public key among the trusted ones. If it has leaked, its public key is taken out of the trusted ones: its seals then answer unknown-key, and only copies that the laboratory kept under its own control since before the leak are evidence. A JSON object that names a member twice is refused; bodies may be larger than elsewhere, so that a record of 2,000 acquisitions fits.
         */
        post: operations["signOffVerification"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/sign-off/comparison": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * What a transfer to another instrument, or a revision of method, instrument or criteria, changes
         * @description Signs off 2 to 10 cases and sets each against the first: one method on several instruments, or two revisions of a method, an instrument or criteria. Findings are matched by check, quantity, acquisition, ion and the place of the stage by its role, so that instruments may name their stages differently; those that are not the same come back with both sides. A setting carries over when neither edge of its window moves by more than the stated fraction of the width, or its cutoff by no more than that fraction of its distance from the ion. The acquisitions of all cases together count as the work. A JSON object that names a member twice is refused.
         */
        post: operations["signOffComparison"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/sign-off/checks": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * Every check of a sign-off, with its default limits and their basis
         * @description The same list that signs off, judges criteria and names findings. As text/markdown it is a page to file.
         */
        get: operations["signOffChecks"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/self-check": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Whether this installation computes as it should, against reference values from elsewhere
         * @description Recomputes published and independently computed values on the machine that answers, and gives the worst deviation of each capability with its limit and source. With a key the answer is sealed and bears the time. It takes no body. `npm run qualify` writes the same as a dated sheet for the installation and operation file; it validates neither a method nor the laboratory's use of the service.
         */
        post: operations["selfCheck"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/.well-known/jwks.json": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * The public keys of seals, the current one first
         * @description The key that seals today and those of earlier generations that the service was told to trust; empty where it was given none. Keep a copy with the records: a seal can then be verified when the service is gone.
         */
        get: operations["sealKeys"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/v1/about": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * Version, edition of the constants, limits and cautions
         * @description Nothing in this answer changes while the service runs.
         */
        get: operations["about"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/problems": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * Every problem the service answers with, and what to do about it
         * @description The type of a problem document (RFC 9457) points to its entry here.
         */
        get: operations["problems"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
}
export type webhooks = Record<string, never>;
export interface components {
    schemas: {
        About: {
            service: string;
            /** @description The same version gives the same answer to the same request. */
            version: string;
            /** @description Edition of the physical constants. */
            constants: string;
            limits: {
                /** @description Largest request body in kB (1000 bytes), but for these two: */
                body_kB: number;
                /** @description Largest body of a sign-off or a comparison in kB. */
                methodBody_kB: number;
                /** @description Largest body of a verification in kB. */
                recordBody_kB: number;
                /** @description Most ions, points or targets in one request. */
                itemsPerRequest: number;
                /** @description Steps after which a solver answers not-converged. */
                stepsPerSolution: number;
                /** @description Largest |a| and |q| for which stability is computed. */
                mathieuParameters: number;
            };
            /** @description What must be known before a result is used. */
            cautions: string[];
        };
        Acquisition: components["schemas"]["Transition"] | components["schemas"]["SelectedIon"] | components["schemas"]["Scan"] | components["schemas"]["ProductScan"] | components["schemas"]["PrecursorScan"] | components["schemas"]["NeutralLossScan"];
        AllowedTolerance: {
            /**
             * @description amplitude: U and V together. ratio: U against V at constant V.
             * @enum {string}
             */
            cause: "field-radius" | "frequency" | "amplitude" | "ratio";
            /** @description If nothing else drifts; null where unbounded. */
            alone_ppm: number | null;
            /** @description If all four causes contribute equally and add up. */
            sharedWorstCase_ppm: number | null;
            /** @description If all four causes contribute equally and independently, as root-sum-square. */
            sharedRootSumSquare_ppm: number | null;
            boundBy: ("centreShift" | "edgeShift" | "widthChange") | null;
        };
        /** @description The laboratory's limits of apex-margin. How far U/V stays below the apex of the stability region, where the window closes: the smallest margin of a stage. */
        ApexMarginCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimitByTolerance"];
            caution?: components["schemas"]["LowerLimitByTolerance"];
        };
        /** @description Gaussian beam at the entrance, centred on the axis. */
        Beam: components["schemas"]["BeamByAxes"] | components["schemas"]["BeamByEnergy"];
        BeamByAxes: {
            /** @description Position in x at the entrance, standard deviation in mm. */
            sigmaX_mm: number;
            /** @description Position in y at the entrance, standard deviation in mm. */
            sigmaY_mm: number;
            /** @description Velocity in x at the entrance, standard deviation in m/s. */
            sigmaVx_mPerS: number;
            /** @description Velocity in y at the entrance, standard deviation in m/s. */
            sigmaVy_mPerS: number;
        };
        BeamByEnergy: {
            /** @description Position in x and in y at the entrance, standard deviation in mm. */
            sigma_mm: number;
            /** @description Mean radial energy of both axes together, in eV per charge; each ion has the velocities that belong to its own m/z. */
            meanRadialEnergy_eVPerCharge: number;
        };
        /** @description A whole region, whatever the box cuts off it. */
        BoundedRegion: {
            region: components["schemas"]["Region"];
            /** @description inner: nearest the origin, where a window is widest. highTip and lowTip: largest and smallest U/V, where it closes. outer: the fourth. */
            corners: {
                inner: components["schemas"]["RegionCorner"];
                highTip: components["schemas"]["RegionCorner"];
                outer: components["schemas"]["RegionCorner"];
                lowTip: components["schemas"]["RegionCorner"];
            };
            /** @description The four sides, following each other around the region. */
            arcs: components["schemas"]["RegionArc"][];
        };
        /** @description A closed interval; null is unbounded on that side. */
        Bounds: {
            min: number | null;
            max: number | null;
        };
        CalibrationLine: {
            /** @description Of powers of the set m/z, 0 upwards. */
            coefficients: {
                power: number;
                value: number;
                standardUncertainty: number | null;
            }[];
            degreesOfFreedom: number;
            /** @description In m/z; where sigma is stated, in units of it. null without degrees of freedom. */
            residualStandardDeviation: number | null;
            influences: components["schemas"]["PeakInfluence"][];
            /** @description The peak with the largest Cook distance, by its index. */
            mostInfluential: number | null;
        };
        CalibrationPeak: {
            /** @description The m/z that was set. */
            setMz: number;
            /** @description The m/z at which the peak was observed. */
            observedMz: number;
            /** @description Standard uncertainty of observedMz; stated for all peaks or for none. */
            sigma?: number;
            width?: components["schemas"]["Width"];
            /** @description The volts at this peak, for the effective field radius. */
            drive?: components["schemas"]["Drive"];
        };
        CalibrationPrediction: {
            setMz: number;
            /** @description Outside the set m/z of the peaks. */
            extrapolated: boolean;
            offset: {
                value: number;
                /** @description Of the fit itself. */
                standardUncertainty: number | null;
                /** @description Of the interval for one more peak. */
                low: number | null;
                high: number | null;
            } | null;
            observedMz: number | null;
            width: {
                value: number;
                /** @description Of the fit itself. */
                standardUncertainty: number | null;
                /** @description Of the interval for one more peak. */
                low: number | null;
                high: number | null;
            } | null;
        };
        CapabilityChecked: {
            capability: string;
            /** @description Where the reference values come from. */
            source: string;
            /** @description How many values were recomputed. */
            values: number;
            /** @description null where a value did not come out at all. */
            worstDeviation: number | null;
            worstAt: string;
            /**
             * @description relative: over the reference. absolute: in the unit of the value. relative-above-1: over the reference where that is above 1, else absolute.
             * @enum {string}
             */
            kind: "relative" | "absolute" | "relative-above-1";
            limit: number;
            /** @enum {string} */
            outcome: "pass" | "fail";
        };
        Catalogue: {
            checks: components["schemas"]["CatalogueEntry"][];
        };
        CatalogueEntry: {
            id: string;
            /** @description What is computed, in one sentence. */
            computes: string;
            /** @description Members of instrument and method that are read. */
            needs: string[];
            quantities: {
                quantity: string;
                unit: string;
                meaning: string;
            }[];
            requiredByDefault: boolean;
            defaults: {
                pass: components["schemas"]["LimitShown"];
                caution: components["schemas"]["LimitShown"];
            } | null;
            /** @description Where the default limits come from. */
            basis: string;
        };
        /** @description How the RF voltage of the collision cell is set. */
        CellRf: components["schemas"]["CellRfFixed"] | components["schemas"]["CellRfCutoff"] | components["schemas"]["CellRfPrecursorQ"] | components["schemas"]["CellRfProductQ"] | components["schemas"]["CellRfTable"];
        CellRfCutoff: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            mode: "cutoff";
            /** @description The low-mass cutoff that was set. */
            mz: number;
        };
        CellRfFixed: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            mode: "fixed";
            rf: components["schemas"]["Rf"];
        };
        CellRfPrecursorQ: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            mode: "precursor-q";
            /** @description q of the set precursor m/z in the cell. */
            q: number;
        };
        CellRfProductQ: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            mode: "product-q";
            /** @description q of the set product m/z in the cell. */
            q: number;
        };
        CellRfTable: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            mode: "table";
            /** @description Low-mass cutoff against set precursor m/z, linear between the points. */
            points: components["schemas"]["CutoffPoint"][];
        };
        /** @description What this acquisition sets in the collision cell, in place of the instrument's. */
        CellSetting: {
            rf?: components["schemas"]["CellRf"];
            /** @description Collision energy, in eV per charge; the sign follows the polarity. */
            collisionEnergy_eVPerCharge?: number;
        };
        /** @description The laboratory's limits of cell-well-depth. Effective potential of the collision cell at 0.8 of its field radius over the largest radial energy to be confined. */
        CellWellDepthCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimit"];
            caution?: components["schemas"]["LowerLimit"];
        };
        CollisionCellStage: {
            /** @description A name of the laboratory's own, no control characters. */
            name: string;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            role: "collision-cell";
            rf: components["schemas"]["CellRf"];
            rodSet?: components["schemas"]["RodSet"];
            residence?: components["schemas"]["Residence"];
            supply?: components["schemas"]["Supply"];
            gas?: {
                /** @description A molecular formula, such as C33H40N2O9. */
                formula: string;
                /** @description Gas pressure in Pa. */
                pressure_Pa: number;
            };
            /** @description Largest radial energy to be confined, in eV per charge. */
            maxRadialEnergy_eVPerCharge?: number;
            /** @description Time in which ions of the last transition leave, in ms. */
            clearing_ms?: number;
        };
        /** @description A finding that is not the same in both cases. */
        ComparedFinding: {
            check: string;
            quantity: string;
            unit: string;
            acquisition: string | null;
            ion: string | null;
            /** @description added and removed stand alone: the finding is there in one case only. */
            changed: ("added" | "removed" | "outcome" | "value" | "limits" | "required")[];
            /**
             * @description By the outcomes, in the order pass, caution, indeterminate, fail.
             * @enum {string}
             */
            direction: "better" | "worse" | "same" | "not-comparable";
            base: components["schemas"]["ComparedFindingSide"] | null;
            other: components["schemas"]["ComparedFindingSide"] | null;
        };
        /** @description The finding in one of both cases. */
        ComparedFindingSide: {
            /** @description JSON Pointer into the request of this case. */
            pointer: string;
            stage: string | null;
            outcome: components["schemas"]["Outcome"];
            required: boolean;
            value: number | null;
            pass: components["schemas"]["Bounds"];
            statement: string;
        };
        /** @description A setting that does not carry over, or of which it cannot be told. */
        ComparedSetting: {
            acquisition: string;
            ion: string;
            /** @description null where it cannot be told. */
            carriesOver: boolean | null;
            /** @enum {string} */
            reason: "window-moved" | "cutoff-moved" | "not-known" | "other-height" | "only-in-base" | "only-in-other";
            /** @description By how much the edge that moved more did so, as a fraction of the width in the first case; of a cutoff, as a fraction of its distance from the ion. */
            shiftOfWidth: number | null;
            base: components["schemas"]["ComparedSettingSide"] | null;
            other: components["schemas"]["ComparedSettingSide"] | null;
        };
        /** @description What the setting comes to in one of both cases. */
        ComparedSettingSide: {
            stage: string;
            setMz: number;
            window: {
                mzLow: number;
                mzHigh: number;
                /**
                 * @description At which height the width is taken: between the stability edges, at half or at a tenth of the peak's height. No default: the three differ.
                 * @enum {string}
                 */
                at: "edges" | "half-height" | "tenth-height";
            } | null;
            cutoffMz: number | null;
        };
        ComparisonAnswer: {
            base: components["schemas"]["ComparisonBase"];
            others: components["schemas"]["ComparisonOther"][];
            withinOfWidth: number;
            /** @description Values that differ by less, relatively, are the same. */
            tolerance: number;
            engine: components["schemas"]["Engine"];
        };
        ComparisonBase: {
            label: string;
            verdict: components["schemas"]["Verdict"];
            outcomeCounts: components["schemas"]["OutcomeCounts"];
        };
        /** @description A sign-off request with a name. */
        ComparisonCase: {
            /** @description What this case is called in the answer; each case another. */
            label: string;
            instrument: components["schemas"]["Instrument"];
            method: components["schemas"]["Method"];
            criteria?: components["schemas"]["Criteria"];
        };
        ComparisonOther: {
            label: string;
            verdict: components["schemas"]["Verdict"];
            outcomeCounts: components["schemas"]["OutcomeCounts"];
            /** @description What the change does, for a person. */
            statement: string;
            /** @description Which parts of the input are not those of the first case. */
            inputChanged: ("instrument" | "method" | "criteria")[];
            findings: components["schemas"]["ComparedFinding"][];
            findingsUnchanged: number;
            settings: components["schemas"]["ComparedSetting"][];
            settingsCarriedOver: number;
        };
        ComparisonRequest: {
            /** @description 2 to 10 cases; every other one is compared with the first. */
            cases: components["schemas"]["ComparisonCase"][];
            /** @description How far an edge of a window may move for the setting to carry over, as a fraction of the window's width; 0.1 when absent. */
            withinOfWidth?: number;
        };
        Compound: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A short text for people, no control characters. */
            name?: string;
            /** @description A molecular formula, such as C33H40N2O9. */
            formula?: string;
            internalStandard?: boolean;
            range?: {
                /** @description Lower end of the working range, in the unit of amount. */
                low: number;
                /** @description Upper end of the working range, in the unit of amount. */
                high: number;
            };
            /** @description Amount of an internal standard, in the unit of the range. */
            amount?: number;
            /** @description Fraction of the labelled compound that is labelled. */
            isotopicPurity?: number;
        };
        /** @description The laboratory's own limits, in place of the defaults. */
        Criteria: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A name of the laboratory's own, no control characters. */
            revision: string;
            checks: components["schemas"]["CriteriaChecks"];
        };
        CriteriaChecks: {
            "set-mz"?: components["schemas"]["SetMzCriterion"];
            "edge-margin"?: components["schemas"]["EdgeMarginCriterion"];
            "window-width"?: components["schemas"]["WindowWidthCriterion"];
            "apex-margin"?: components["schemas"]["ApexMarginCriterion"];
            "supply-headroom"?: components["schemas"]["SupplyHeadroomCriterion"];
            "voltage-convention"?: components["schemas"]["VoltageConventionCriterion"];
            "rf-cycles"?: components["schemas"]["RfCyclesCriterion"];
            "scan-shift"?: components["schemas"]["ScanShiftCriterion"];
            "product-above-cutoff"?: components["schemas"]["ProductAboveCutoffCriterion"];
            "precursor-q-in-cell"?: components["schemas"]["PrecursorQInCellCriterion"];
            "cell-well-depth"?: components["schemas"]["CellWellDepthCriterion"];
            "dwell-time"?: components["schemas"]["DwellTimeCriterion"];
            "pause-time"?: components["schemas"]["PauseTimeCriterion"];
            "points-across-peak"?: components["schemas"]["PointsAcrossPeakCriterion"];
            "peak-tails"?: components["schemas"]["PeakTailsCriterion"];
        };
        CutoffPoint: {
            /** @description Set precursor m/z. */
            mz: number;
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            cutoffMz: number;
        };
        /** @description The DC between the rod pairs, or both pairs against ground: the second gives U and the rod offset, which must not be taken for U. */
        Dc: components["schemas"]["DcDifference"] | components["schemas"]["DcPairs"];
        DcDifference: {
            /** @description DC voltage in V, read as the members beside it say. */
            volts: number;
            /**
             * @description Between which points the voltage is taken. No default: a wrong guess is a factor of two.
             * @enum {string}
             */
            between: "pole-and-ground" | "pole-and-pole";
        };
        DcPairs: {
            /** @description DC of the x pair against ground, in V. */
            pairX_V: number;
            /** @description DC of the y pair against ground, in V. */
            pairY_V: number;
        };
        DriftBudget: {
            /** @description Each at the positive end of its tolerance; the negative end gives the opposite sign. */
            causes: {
                /**
                 * @description amplitude: U and V together. ratio: U against V at constant V.
                 * @enum {string}
                 */
                cause: "field-radius" | "frequency" | "amplitude" | "ratio";
                tolerance_ppm: number;
                /** @description Of the edge at low m/z. */
                low: number;
                /** @description Of the edge at high m/z. */
                high: number;
                centre: number;
                width: number;
            }[];
            worstCase: components["schemas"]["DriftShifts"];
            rootSumSquare: components["schemas"]["DriftShifts"];
            /** @description The exact width with U/V at either end of its tolerance, to judge the first order by; near the apex it is not good. */
            widthAtRatioEnds: {
                /** @description null: the window closes before that. */
                raised: number | null;
                lowered: number | null;
            };
        };
        DriftBudgetAnswer: {
            window: {
                mzLow: number;
                mzHigh: number;
                mzCentre: number;
                mzWidth: number;
                resolution: number;
                /** @description How far U/V lies below the apex, in ppm of it. */
                apexMargin_ppm: number;
            } | null;
            /** @description Why there is no window. no-dc: an RF-only rod set has a cutoff but no window; its cutoff moves as the amplitude and as 1/f² and 1/r0². */
            reason: ("above-apex" | "no-rf" | "no-dc" | "width-height-needs-peak-profile" | "resolution-not-reachable" | "not-converged") | null;
            /** @description Shift in m/z per ppm of each cause. */
            sensitivities: {
                /**
                 * @description amplitude: U and V together. ratio: U against V at constant V.
                 * @enum {string}
                 */
                cause: "field-radius" | "frequency" | "amplitude" | "ratio";
                /** @description Of the edge at low m/z. */
                low: number;
                /** @description Of the edge at high m/z. */
                high: number;
                centre: number;
                width: number;
            }[];
            /** @description null without tolerances or without a window. */
            budget: components["schemas"]["DriftBudget"] | null;
            /** @description null without limits or without a window. */
            allowed: components["schemas"]["AllowedTolerance"][] | null;
            /** @description null without tune records. */
            retune: components["schemas"]["RetuneInterval"] | null;
        };
        /** @description The window that these volts open. */
        DriftBudgetOfDrive: {
            rodSet: components["schemas"]["RodSet"];
            drive: components["schemas"]["Drive"];
            /** @description Independent tolerances; one that is absent does not drift. */
            tolerances?: {
                /** @description Relative tolerance, plus or minus, in ppm. */
                fieldRadius_ppm?: number;
                /** @description Relative tolerance, plus or minus, in ppm. */
                frequency_ppm?: number;
                /** @description U and V moving together, plus or minus, in ppm. */
                amplitude_ppm?: number;
                /** @description U against V at constant V, plus or minus, in ppm. */
                ratio_ppm?: number;
            };
            /** @description What may move, for the question backwards: at least one of the three. */
            limits?: {
                /** @description Largest permitted shift of the centre, plus or minus, in m/z. */
                centreShift?: number;
                /** @description Largest permitted shift of either edge, plus or minus, in m/z. */
                edgeShift?: number;
                /** @description Largest permitted change of the width, plus or minus, in m/z. */
                widthChange?: number;
            };
            /** @description Successive tunes without a correction between them, for the retune interval. */
            tune?: {
                records: components["schemas"]["TuneRecord"][];
                /** @description Largest permitted offset, plus or minus, in m/z. */
                limit: number;
                /** @description Confidence of the two-sided interval, such as 0.95. No default: the laboratory decides. */
                confidence: number;
            };
        };
        /** @description A window with nothing known of the instrument. */
        DriftBudgetOfWidth: {
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            mzCentre: number;
            width: components["schemas"]["Width"];
            /** @description Independent tolerances; one that is absent does not drift. */
            tolerances?: {
                /** @description Relative tolerance, plus or minus, in ppm. */
                fieldRadius_ppm?: number;
                /** @description Relative tolerance, plus or minus, in ppm. */
                frequency_ppm?: number;
                /** @description U and V moving together, plus or minus, in ppm. */
                amplitude_ppm?: number;
                /** @description U against V at constant V, plus or minus, in ppm. */
                ratio_ppm?: number;
            };
            /** @description What may move, for the question backwards: at least one of the three. */
            limits?: {
                /** @description Largest permitted shift of the centre, plus or minus, in m/z. */
                centreShift?: number;
                /** @description Largest permitted shift of either edge, plus or minus, in m/z. */
                edgeShift?: number;
                /** @description Largest permitted change of the width, plus or minus, in m/z. */
                widthChange?: number;
            };
            /** @description Successive tunes without a correction between them, for the retune interval. */
            tune?: {
                records: components["schemas"]["TuneRecord"][];
                /** @description Largest permitted offset, plus or minus, in m/z. */
                limit: number;
                /** @description Confidence of the two-sided interval, such as 0.95. No default: the laboratory decides. */
                confidence: number;
            };
        };
        DriftBudgetRequest: components["schemas"]["DriftBudgetOfDrive"] | components["schemas"]["DriftBudgetOfWidth"];
        /** @description Shifts in m/z, to first order. */
        DriftShifts: {
            /** @description Of the edge at low m/z. */
            low: number;
            /** @description Of the edge at high m/z. */
            high: number;
            centre: number;
            width: number;
        };
        /** @description The voltages on a rod set. x is the pair whose DC has the sign of the ion. */
        Drive: {
            rf: components["schemas"]["Rf"];
            /** @description Absent means RF-only. */
            dc?: components["schemas"]["Dc"];
        };
        DrivePoint: {
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            mz: number;
            drive: components["schemas"]["Drive"];
        };
        /** @description The laboratory's limits of dwell-time. Shortest dwell time that an acquisition is given, or the counts in it where a count rate is stated. */
        DwellTimeCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimitOfDwell"];
            caution?: components["schemas"]["LowerLimitOfDwell"];
        };
        /** @description The laboratory's limits of edge-margin. Distance in m/z from the ion to the nearer edge of its window, after the drift allowed between two tunes. */
        EdgeMarginCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimitByWidth"];
            caution?: components["schemas"]["LowerLimitByWidth"];
        };
        /** @description What computed a result: the same engine gives the same numbers. */
        Engine: {
            /** @description Version of the service that computed. */
            version: string;
            /** @description Edition of the physical constants. */
            constants: string;
        };
        /** @description One thing that is wrong with a request, and where. */
        ErrorOfMember: {
            /** @description JSON Pointer (RFC 6901) to the member; empty for the body. */
            pointer: string;
            /** @enum {string} */
            code: "unknown-member" | "missing-member" | "wrong-type" | "not-whole" | "out-of-range" | "not-one-of" | "wrong-length" | "wrong-count" | "wrong-format" | "duplicate-member" | "too-deep" | "not-unique" | "not-found" | "not-above" | "not-below" | "charge-is-zero" | "charge-against-polarity" | "limits-crossed" | "stages-do-not-fit" | "needs-two-pole-pairs" | "member-not-taken" | "dc-not-taken" | "ion-trap-not-computed" | "formula-not-computed" | "waveform-not-computed" | "region-not-computed";
            /** @description What was found and what is expected, for a person. */
            detail: string;
        };
        /**
         * @description How a finding knows: from observed peaks, from the physics of stated voltages and rods, or only from a claim. What follows from a claim proves nothing.
         * @enum {string}
         */
        Evidence: "measured" | "computed" | "stated";
        FindDrive: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "drive";
            rodSet: components["schemas"]["RodSet"];
            convention: components["schemas"]["VoltageConvention"];
            /** @description 1 to 1000 items; the results come back in the same order. */
            points: {
                ion: components["schemas"]["Ion"];
                /** @description Mathieu parameter a of the x plane, dimensionless. */
                a: number;
                /** @description Mathieu parameter q of the x plane, dimensionless. */
                q: number;
            }[];
        };
        FindFieldRadius: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "field-radius";
            /** @description RF frequency f in MHz (not angular frequency). */
            frequency_MHz: number;
            drive: components["schemas"]["Drive"];
            /** @description 1 to 1000 items; the results come back in the same order. */
            points: {
                ion: components["schemas"]["Ion"];
                /** @description Mathieu parameter q of the x plane, dimensionless. */
                q: number;
            }[];
        };
        FindFrequency: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "frequency";
            /** @description Field radius r0 in mm: half the gap between opposite rods, not the rod radius and not the diameter. */
            fieldRadius_mm: number;
            drive: components["schemas"]["Drive"];
            /** @description 1 to 1000 items; the results come back in the same order. */
            points: {
                ion: components["schemas"]["Ion"];
                /** @description Mathieu parameter q of the x plane, dimensionless. */
                q: number;
            }[];
        };
        FindMz: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "mz";
            rodSet: components["schemas"]["RodSet"];
            drive: components["schemas"]["Drive"];
            /** @description 1 to 1000 items; the results come back in the same order. */
            q: number[];
        };
        FindParameters: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "parameters";
            rodSet: components["schemas"]["RodSet"];
            drive: components["schemas"]["Drive"];
            /** @description 1 to 1000 ions; the results come back in the same order. */
            ions: components["schemas"]["Ion"][];
        };
        /** @description One judged quantity of one subject. */
        Finding: {
            check: string;
            quantity: string;
            subject: components["schemas"]["Subject"];
            outcome: components["schemas"]["Outcome"];
            /** @description Whether this finding counts in the verdict. */
            required: boolean;
            /** @description stated where nothing could be judged. */
            evidence: components["schemas"]["Evidence"];
            value: number | null;
            /** @description UCUM unit of value and bounds; 1 for m/z and ratios. */
            unit: string;
            pass: components["schemas"]["Bounds"];
            caution: components["schemas"]["Bounds"];
            /** @description Signed distance of value to the nearer pass bound, negative outside. */
            margin: number | null;
            passesIf: components["schemas"]["PassesIf"] | null;
            /** @description JSON Pointers of the inputs that a judgement lacks. */
            missing: string[];
            statement: string;
            /** @description Where the limits come from. */
            basis: string;
        };
        FoundDrive: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "drive";
            results: {
                mz: number;
                /** @description In the convention of the request; not settings to apply. */
                drive: components["schemas"]["Drive"] | null;
                /** @description The volts are beyond what a request may state. */
                reason: "drive-out-of-range" | null;
            }[];
        };
        FoundFieldRadius: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "field-radius";
            results: {
                mz: number;
                q: number;
                fieldRadius_mm: number | null;
                /** @description Why there is no value: without RF, or at q = 0, there is none. */
                reason: ("no-rf" | "q-is-zero") | null;
            }[];
        };
        FoundFrequency: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "frequency";
            results: {
                mz: number;
                q: number;
                frequency_MHz: number | null;
                /** @description Why there is no value: without RF, or at q = 0, there is none. */
                reason: ("no-rf" | "q-is-zero") | null;
            }[];
        };
        FoundMz: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "mz";
            results: {
                q: number;
                mz: number | null;
                /** @description Why there is no value: without RF, or at q = 0, there is none. */
                reason: ("no-rf" | "q-is-zero") | null;
            }[];
        };
        FoundParameters: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            find: "parameters";
            results: {
                mz: number;
                a: number;
                q: number;
            }[];
            /** @description Mean of both pairs against ground, which moves all ions alike and is no part of U; null where the drive does not state both pairs. */
            rodOffset_V: number | null;
        };
        /** @description What runs the service; no names. */
        Host: {
            runtime: string;
            version: string;
            architecture: string;
            system: string;
        };
        /** @description What is known of the instrument. Nothing about the rods need be known. */
        Instrument: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A name of the laboratory's own, no control characters. */
            revision: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            /** @description The rod sets, in the order in which ions meet them. */
            stages: components["schemas"]["Stage"][];
        };
        /** @description An ion, by its m/z or by formula and adduct. */
        Ion: components["schemas"]["IonByMz"] | components["schemas"]["IonByFormula"];
        IonByFormula: {
            /** @description A molecular formula, such as C33H40N2O9. */
            formula: string;
            /** @description The adduct in brackets with its charge, such as [M+H]+. */
            adduct: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            /** @enum {string} */
            isotopologue?: "monoisotopic" | "most-abundant";
        };
        IonByMz: {
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            mz: number;
            /** @description Charge number with sign; 1 or -1 by the polarity when absent. Zero is refused. */
            charge?: number;
            /** @description A short text for people, no control characters. */
            label?: string;
        };
        IonGuideStage: {
            /** @description A name of the laboratory's own, no control characters. */
            name: string;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            role: "ion-guide";
            rf?: components["schemas"]["Rf"];
            rodSet?: components["schemas"]["RodSet"];
            residence?: components["schemas"]["Residence"];
            supply?: components["schemas"]["Supply"];
        };
        /** @description Refused: a linear formula does not hold in an ion trap. */
        IonTrapStage: {
            /** @description A name of the laboratory's own, no control characters. */
            name: string;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            role: "ion-trap";
        } & {
            [key: string]: unknown;
        };
        /** @description The record as it was kept: a SealedRecord, or what has become of one. */
        KeptRecord: {
            [key: string]: unknown;
        };
        /** @description Parts of a limit, as criteria state them: min, max, minOfWidth and the like. */
        LimitShown: {
            [key: string]: number;
        };
        LowerLimit: {
            /** @description Smallest value, in the unit of the finding. */
            min: number;
        };
        LowerLimitByTolerance: {
            /** @description Smallest value, in the unit of the finding. */
            min: number;
            /** @description Smallest value as a multiple of the stated tolerance. */
            minOfTolerance?: number;
        };
        LowerLimitByWidth: {
            /** @description Smallest value in m/z. */
            min: number;
            /** @description Smallest value as a fraction of the window's width. */
            minOfWidth?: number;
        };
        LowerLimitOfDwell: {
            /** @description Shortest dwell time in ms. */
            min: number;
            /** @description Fewest counts in one dwell time. */
            minCounts?: number;
        };
        MassFilterStage: {
            /** @description A name of the laboratory's own, no control characters. */
            name: string;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            role: "mass-filter";
            /**
             * @description filtering when absent; rf-only when the rods pass ions without selecting them.
             * @enum {string}
             */
            mode?: "filtering" | "rf-only";
            /** @description Required unless mode is rf-only. */
            operatingPoint?: components["schemas"]["OperatingPoint"];
            /** @description The RF voltage of a mass filter run as rf-only. */
            rf?: components["schemas"]["Rf"];
            rodSet?: components["schemas"]["RodSet"];
            residence?: components["schemas"]["Residence"];
            beam?: components["schemas"]["Beam"];
            supply?: components["schemas"]["Supply"];
            /** @description The m/z range that the maker guarantees. */
            rated?: {
                /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
                mzLow: number;
                /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
                mzHigh: number;
            };
            tolerances?: components["schemas"]["Tolerances"];
            /** @description Time the voltages need to settle after a step, in ms. */
            settle_ms?: number;
        };
        MathieuParametersAnswer: components["schemas"]["FoundParameters"] | components["schemas"]["FoundDrive"] | components["schemas"]["FoundMz"] | components["schemas"]["FoundFrequency"] | components["schemas"]["FoundFieldRadius"];
        MathieuParametersRequest: components["schemas"]["FindParameters"] | components["schemas"]["FindDrive"] | components["schemas"]["FindMz"] | components["schemas"]["FindFrequency"] | components["schemas"]["FindFieldRadius"];
        MeasuredPeak: {
            /** @description The m/z that was set. */
            setMz: number;
            /** @description The m/z at which the peak was observed. */
            observedMz: number;
            width: components["schemas"]["Width"];
        };
        /** @description What the method acquires. */
        Method: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A name of the laboratory's own, no control characters. */
            revision: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            polarity: components["schemas"]["Polarity"];
            timing: components["schemas"]["Timing"];
            chromatographicPeakWidth?: {
                /** @description Width of the chromatographic peak in s. */
                value_s: number;
                /** @enum {string} */
                at: "base" | "half-height";
            };
            compounds?: components["schemas"]["Compound"][];
            acquisition: components["schemas"]["Acquisition"][];
        };
        MzCalibrationAnswer: {
            /** @description Observed less set m/z against set m/z. */
            position: components["schemas"]["CalibrationLine"] | null;
            positionReason: ("too-few-points" | "too-few-different-points" | "widths-at-different-heights") | null;
            /** @description Width in m/z against set m/z, linear, of the peaks that state one. */
            width: components["schemas"]["CalibrationLine"] | null;
            widthReason: ("too-few-points" | "too-few-different-points" | "widths-at-different-heights") | null;
            widthAt: ("edges" | "half-height" | "tenth-height") | null;
            predictions: components["schemas"]["CalibrationPrediction"][];
            /** @description The r0 with which the stated volts centre their window on the observed m/z; null where no peak states its drive. */
            effectiveFieldRadius: {
                mean_mm: number | null;
                /** @description Scatter of the peaks; null with fewer than two. */
                standardDeviation_mm: number | null;
                peaks: {
                    peak: number;
                    fieldRadius_mm: number | null;
                    /** @description no-window: these volts pass nothing, or everything above a cutoff. */
                    reason: "no-window" | null;
                }[];
            } | null;
        };
        MzCalibrationRequest: {
            peaks: components["schemas"]["CalibrationPeak"][];
            /** @description Degree of the polynomial of observed less set m/z: 1 linear, 2 quadratic. */
            positionDegree: number;
            /** @description Confidence of the two-sided interval, such as 0.95. No default: the laboratory decides. */
            confidence: number;
            /** @description Set m/z at which to predict. */
            wanted?: number[];
            /** @description Needed where a peak states its drive. */
            frequency_MHz?: number;
        };
        /** @description Equally spaced m/z, both ends among them. */
        MzRange: {
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            from: number;
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            to: number;
            points: number;
        };
        /** @description These m/z, in this order. */
        MzValues: {
            values: number[];
        };
        Neighbour: {
            ion: components["schemas"]["Ion"];
            /** @description Response of the neighbour as a fraction of the target's. */
            fractionOfTarget: number;
            attenuation?: {
                /** @description What is left of the neighbour, as a fraction. */
                factor: number;
                /** @description A text for people, no control characters. */
                evidence: string;
            };
        };
        /** @description Both filters scan at a fixed distance; mzFrom and mzTo are the precursor's. */
        NeutralLossScan: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            /** @description id of a compound of the method. */
            compound?: string;
            /** @description The method's polarity when absent. */
            polarity?: components["schemas"]["Polarity"];
            /** @description Time between the step to this acquisition and its dwell, in ms. */
            pause_ms?: number;
            /** @description When it is acquired; always when absent. */
            retention?: components["schemas"]["Retention"];
            /** @description m/z at which the scan starts. */
            mzFrom: number;
            /** @description m/z at which the scan ends; above mzFrom. */
            mzTo: number;
            /** @description Scan rate in m/z per second. */
            rate_mzPerS: number;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            kind: "neutral-loss-scan";
            /** @description Distance of both filters in m/z: mass of the loss over the charge number. */
            lossMz: number;
            precursorWidth?: components["schemas"]["Width"];
            productWidth?: components["schemas"]["Width"];
            cell?: components["schemas"]["CellSetting"];
        };
        /**
         * @description unknown-format: this version does not know the layout of the record. input-refused: the input on record is no valid request to this version. result-differs: see differences.
         * @enum {string}
         */
        NotReproduced: "unknown-format" | "input-refused" | "result-differs";
        /** @description What could not be judged and does not count in the verdict. */
        NotShown: {
            check: string;
            quantity: string;
            missing: string[];
            /** @description How many findings lack this. */
            findings: number;
            statement: string;
        };
        /** @description How the working point of a mass filter is known. */
        OperatingPoint: components["schemas"]["OperatingPointByPeaks"] | components["schemas"]["OperatingPointByDrives"] | components["schemas"]["OperatingPointByLaw"] | components["schemas"]["OperatingPointStated"];
        /** @description Voltages read from the supply at set m/z. */
        OperatingPointByDrives: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            by: "drives";
            points: components["schemas"]["DrivePoint"][];
        };
        /** @description The straight line that the supply follows. */
        OperatingPointByLaw: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            by: "drive-law";
            /** @description RF volts per unit of set m/z, in the convention stated beside them. */
            rfPerMz: components["schemas"]["Rf"];
            /** @description U/V of the straight line, U and V between the same points and V zero-to-peak, dimensionless. */
            dcSlope: number;
            /** @description What the straight line takes off: U = dcSlope V - dcOffset_V, between the points that rfPerMz names. */
            dcOffset_V: number;
        };
        /** @description The peaks of a tune report. */
        OperatingPointByPeaks: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            by: "measured-peaks";
            peaks: components["schemas"]["MeasuredPeak"][];
        };
        /** @description Only claimed: what follows from it proves nothing. */
        OperatingPointStated: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            by: "stated";
            width: components["schemas"]["Width"];
        };
        /**
         * @description indeterminate names what is missing and never counts as a pass.
         * @enum {string}
         */
        Outcome: "pass" | "caution" | "fail" | "indeterminate" | "not-applicable";
        OutcomeCounts: {
            pass: number;
            caution: number;
            fail: number;
            indeterminate: number;
            "not-applicable": number;
        };
        /** @description The m/z that are stable in both planes in an ideal field after any number of RF cycles. */
        Passband: {
            /** @description null for a region without a name: see bands. */
            region: components["schemas"]["RegionName"] | null;
            /** @description The bands n_x and n_y of the region. */
            bands: {
                x: number;
                y: number;
            };
            /** @description m/z of the edge below which ions are lost. */
            mzLow: number;
            /** @description m/z of the edge above which ions are lost; null where the field has no mean, so that there is no upper edge. */
            mzHigh: number | null;
            /** @description Half-way between both edges in m/z. */
            mzCentre: number | null;
            /** @description Distance of both edges in m/z. */
            mzWidth: number | null;
            /** @description mzCentre/mzWidth, between the edges. */
            resolution: number | null;
            low: components["schemas"]["PassbandEdge"];
            high: components["schemas"]["PassbandEdge"] | null;
        };
        PassbandAnswer: {
            /** @description The windows in the region asked for, by falling m/z; empty when nothing passes, and reason says why. */
            passbands: components["schemas"]["Passband"][];
            /** @description What the same volts let through in other regions, the second window near 0.12 of an RF-only cutoff for one; null where that was not found out. */
            otherWindows: components["schemas"]["Passband"][] | null;
            /** @description Windows at q above this, that is, at very low m/z, are not sought. */
            searchedToQ: number | null;
            /** @description Why there is no passband. above-apex: U/V is at or above that at which the first region closes. below-lower-apex: the mean of the rectangular wave drives the ions out and the DC does not make up for it. scan-line-misses-region: the line of this U/V does not cross the region asked for. width-height-needs-peak-profile: the width is not taken at the edges, and this version cannot convert it. */
            reason: ("above-apex" | "below-lower-apex" | "scan-line-misses-region" | "no-rf" | "width-height-needs-peak-profile" | "resolution-not-reachable" | "not-converged") | null;
            /** @description U/V, both pole-to-ground, V zero-to-peak; null without RF. */
            dcToRfRatio: number | null;
            /** @description U/V at which the first region closes; with a rectangular wave that of its duty cycle, null where it lies outside the computed domain. */
            apexRatio: number | null;
            /** @description How far U/V lies below the apex, in ppm of the apex; negative above it. null without RF, and where the apex is not above zero. */
            apexMargin_ppm: number | null;
        };
        /** @description Where the scan line leaves the region. */
        PassbandEdge: {
            a: number;
            q: number;
            /** @description The rods that take an ion just outside this edge; in the first region light ions x, heavy ones y. null where the window goes on beyond this q, but no edge is sought there. */
            lostTo: ("x" | "y") | null;
        };
        /** @description What do these volts let through? */
        PassbandOfDrive: {
            rodSet: components["schemas"]["RodSet"];
            drive: components["schemas"]["Drive"];
            /**
             * @description The region in which to look; the first when absent.
             * @enum {string}
             */
            region?: "first" | "second" | "third" | "any";
        };
        /** @description What does such a window mean, with nothing known of the instrument? */
        PassbandOfWidth: {
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            mzCentre: number;
            width: components["schemas"]["Width"];
        };
        PassbandRequest: components["schemas"]["PassbandOfDrive"] | components["schemas"]["PassbandOfWidth"];
        /** @description The interval of one input in which the finding would pass, all else unchanged. */
        PassesIf: {
            /** @description JSON Pointer of the input that would have to change. */
            input: string;
            min: number | null;
            max: number | null;
            /** @description UCUM unit of the bounds, or of the input. */
            unit: string;
        };
        /** @description The laboratory's limits of pause-time. Pause before an acquisition over the time that the voltages need to settle and the ion to fly through all stages, and the cell to clear where the acquisition before it has the same product. */
        PauseTimeCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimit"];
            caution?: components["schemas"]["LowerLimit"];
        };
        /** @description Position, height and widths of the peak of the first stability region. */
        Peak: {
            /** @description m/z of the largest transmission; on a flat top any point of it. */
            mz: number;
            /** @description The height of the peak. */
            transmission: number;
            /** @description Width at half height, in m/z; null where a flank does not come down to it. */
            widthHalfHeight: number | null;
            /** @description Width at a tenth of the height, in m/z; null where a flank does not come down to it. */
            widthTenthHeight: number | null;
            halfHeight: components["schemas"]["PeakFlanks"] | null;
            tenthHeight: components["schemas"]["PeakFlanks"] | null;
            /** @description The stability edges, between which the window lies whatever the beam. */
            edges: {
                mzLow: number;
                mzHigh: number;
                mzCentre: number;
                width: number;
            };
            /** @description m/z of the largest transmission minus the edges' centre. */
            shiftFromCentre: number;
            /** @description Largest absolute error of the transmissions from which the peak was found. */
            errorBound: number;
        };
        /** @description Where the peak has fallen to a share of its height. */
        PeakFlanks: {
            mzLow: number;
            mzHigh: number;
            /** @description Middle of both flanks minus the edges' centre, in m/z. */
            shiftFromCentre: number;
        };
        PeakInfluence: {
            /** @description Index in the request's peaks. */
            peak: number;
            residual: number;
            /** @description 0 to 1: at 1 the fit follows this peak whatever it says. */
            leverage: number;
            /** @description Residual over its scatter without this peak; beyond about 3 the peak does not belong. */
            studentizedResidual: number | null;
            /** @description How far the whole fit moves without this peak, over its own uncertainty. */
            cookDistance: number | null;
        };
        PeakProfileAnswer: {
            points: components["schemas"]["ProfilePoint"][];
            peak: components["schemas"]["Peak"] | null;
            /** @description Why there is no peak. no-upper-edge: RF-only rods pass everything above their cutoff. above-apex: U/V is at or above that at which the first region closes. no-rf: no RF voltage. nothing-passes: less than a millionth of the beam passes in the middle of the window. no-maximum-near-the-window: the residence is so short that no peak forms. outside-computed-domain, not-converged: as for points. */
            peakReason: ("not-asked-for" | "no-upper-edge" | "above-apex" | "no-rf" | "nothing-passes" | "no-maximum-near-the-window" | "outside-computed-domain" | "not-converged") | null;
            /** @description How the points were computed, the worst of them; null where none was. */
            method: {
                /** @description Start phases of the RF over which the mean was taken, at most. */
                phases: number;
                /** @description Finest spacing of the times at which the aperture was looked at. */
                samplesPerCycle: number;
                /** @description Largest absolute error of a point: phases, gaps between samples and quadrature together. */
                errorBound: number;
            } | null;
        };
        PeakProfileRequest: {
            rodSet: components["schemas"]["RodSet"];
            drive: components["schemas"]["Drive"];
            residence: components["schemas"]["Residence"];
            beam: components["schemas"]["Beam"];
            /** @description Where the transmission is wanted. */
            mz: components["schemas"]["MzValues"] | components["schemas"]["MzRange"];
            /** @description Wanted accuracy, 0.001 when absent: absolute for the points, and relative to the height for the peak. */
            accuracy?: number;
            /** @description Rate at which the m/z of the window moves while the ions fly, negative downwards; the drive is that at entry. 0 when absent. */
            scanRate_mzPerS?: number;
            /** @description false leaves the peak out, so that the whole work may go into the points. true when absent. */
            findPeak?: boolean;
        };
        /** @description The laboratory's limits of peak-tails. Nothing: it stands here so that nobody takes its absence for a result. */
        PeakTailsCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
        };
        /** @description Motion in one plane; all null outside the computed domain. */
        PlaneStability: {
            stable: boolean | null;
            /** @description The stable band n, between a_n(q) and b_{n+1}(q). */
            band: number | null;
            /** @description Total characteristic exponent β, between n and n + 1 in band n. */
            characteristicExponent: number | null;
            /** @description Half the trace over one RF period, cos πβ where the motion is stable. */
            halfTrace: number | null;
        };
        /** @description The laboratory's limits of points-across-peak. Base width of the chromatographic peak over the time of one round at the busiest moment of the schedule. */
        PointsAcrossPeakCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimit"];
            caution?: components["schemas"]["LowerLimit"];
        };
        /** @enum {string} */
        Polarity: "positive" | "negative";
        /** @description The laboratory's limits of precursor-q-in-cell. Mathieu q of the precursor ion in the RF-only collision cell. */
        PrecursorQInCellCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["RangeLimit"];
            caution?: components["schemas"]["RangeLimit"];
        };
        /** @description The filter before the cell scans, the one behind it holds the product. */
        PrecursorScan: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            /** @description id of a compound of the method. */
            compound?: string;
            /** @description The method's polarity when absent. */
            polarity?: components["schemas"]["Polarity"];
            /** @description Time between the step to this acquisition and its dwell, in ms. */
            pause_ms?: number;
            /** @description When it is acquired; always when absent. */
            retention?: components["schemas"]["Retention"];
            /** @description m/z at which the scan starts. */
            mzFrom: number;
            /** @description m/z at which the scan ends; above mzFrom. */
            mzTo: number;
            /** @description Scan rate in m/z per second. */
            rate_mzPerS: number;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            kind: "precursor-scan";
            product: components["schemas"]["Ion"];
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            setProductMz?: number;
            productWidth?: components["schemas"]["Width"];
            precursorWidth?: components["schemas"]["Width"];
            cell?: components["schemas"]["CellSetting"];
        };
        /** @description Problem details (RFC 9457). */
        Problem: {
            /** @description URI reference of the kind of problem, described at GET /problems. */
            type: string;
            /** @description The kind of problem in a few words; the same for every occurrence. */
            title: string;
            /** @description The HTTP status code. */
            status: number;
            /** @description This occurrence, for a person. */
            detail: string;
            /**
             * @description The kind of problem, for a program.
             * @enum {string}
             */
            code: "malformed-json" | "interrupted-body" | "not-found" | "method-not-allowed" | "not-acceptable" | "body-too-large" | "unsupported-media-type" | "invalid-request" | "too-much-work" | "internal-error";
            /** @description Also in the X-Request-Id header and in the service's log. */
            requestId: string;
            /** @description With invalid-request only. */
            errors?: components["schemas"]["ErrorOfMember"][];
            /** @description How many errors there are beyond those shown. With invalid-request only. */
            errorsOmitted?: number;
        };
        ProblemCatalogue: {
            problems: components["schemas"]["ProblemKind"][];
            /** @description The codes in `errors` of an invalid-request problem. */
            errorsOfMembers: {
                code: string;
                when: string;
            }[];
        };
        ProblemKind: {
            code: string;
            status: number;
            title: string;
            when: string;
            remedy: string;
        };
        /** @description The laboratory's limits of product-above-cutoff. m/z of the product ion over the low-mass cutoff of the RF-only collision cell as the acquisition sets it, and of the lightest ion over the cutoff of each rod set that only passes ions. */
        ProductAboveCutoffCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimit"];
            caution?: components["schemas"]["LowerLimit"];
        };
        ProductByNeutralLoss: {
            /** @description A molecular formula, such as C33H40N2O9. */
            neutralLoss: string;
        };
        /** @description The filter before the cell holds the precursor, the one behind it scans. */
        ProductScan: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            /** @description id of a compound of the method. */
            compound?: string;
            /** @description The method's polarity when absent. */
            polarity?: components["schemas"]["Polarity"];
            /** @description Time between the step to this acquisition and its dwell, in ms. */
            pause_ms?: number;
            /** @description When it is acquired; always when absent. */
            retention?: components["schemas"]["Retention"];
            /** @description m/z at which the scan starts. */
            mzFrom: number;
            /** @description m/z at which the scan ends; above mzFrom. */
            mzTo: number;
            /** @description Scan rate in m/z per second. */
            rate_mzPerS: number;
            precursor: components["schemas"]["Ion"];
            /** @description m/z set for the precursor; its computed m/z when absent. */
            setPrecursorMz?: number;
            /** @description Window that the method claims for the precursor. */
            precursorWidth?: components["schemas"]["Width"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            kind: "product-scan";
            productWidth?: components["schemas"]["Width"];
            cell?: components["schemas"]["CellSetting"];
        };
        ProfilePoint: {
            mz: number;
            /** @description Share of the beam that passes, 0 to 1. */
            transmission: number | null;
            /** @description Why there is no transmission. outside-computed-domain: the motion is too violent, as that of very light ions. not-converged: the accuracy was not reached within the steps that one value may take. no-window-to-scan: a scan rate is stated, but the drive has no window that could move. dc-not-below-rf: with U at or above V the field of one plane never focuses, and nothing is computed. */
            reason: ("outside-computed-domain" | "not-converged" | "no-window-to-scan" | "dc-not-below-rf") | null;
        };
        /** @description A public key that verifies seals (RFC 7517, RFC 8037). */
        PublicSealKey: {
            /** @constant */
            kty: "OKP";
            /** @constant */
            crv: "Ed25519";
            /** @description The public key, base64url. */
            x: string;
            /** @description RFC 7638 thumbprint, SHA-256, base64url. */
            kid: string;
            /** @constant */
            use: "sig";
            /** @constant */
            alg: "Ed25519";
        };
        RangeLimit: {
            /** @description Largest value, in the unit of the finding. */
            max: number;
            /** @description Smallest value, in the unit of the finding. */
            min?: number;
        };
        RecordDifference: {
            /** @description JSON Pointer into the record; /result/findings/- is a finding that is not on record. */
            pointer: string;
            /** @description Absent where the record has no such member. */
            recorded?: components["schemas"]["ShownValue"];
            /** @description Absent where this version has no such member. */
            recomputed?: components["schemas"]["ShownValue"];
        };
        RecordDigests: {
            /** @description SHA-256 of the canonical JSON (RFC 8785) of input, in hexadecimal digits. */
            input: string;
            /** @description SHA-256 of the canonical JSON of result, in hexadecimal digits. */
            result: string;
            /** @description SHA-256 of the canonical JSON of format, engine and digests with only the two above in it, in hexadecimal digits. */
            record: string;
        };
        RectangularWaveform: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            shape: "rectangular";
            /** @description Fraction of a period in which the x pair is at the level that has the sign of the ion. */
            dutyCycle: number;
            /**
             * @description dc: the mean of the wave reaches the rods and acts as DC; ac: it does not.
             * @enum {string}
             */
            coupling: "dc" | "ac";
        };
        /** @description A stability region: its bands n_x and n_y, and its name if it has one. */
        Region: {
            x: number;
            y: number;
            name: components["schemas"]["RegionName"] | null;
        };
        /** @description One side of a region, from corner to corner. */
        RegionArc: {
            /** @description The curve in the notation of DLMF 28.2, such as a = b_1(q). */
            curve: string;
            /**
             * @description The rods that take an ion beyond this side.
             * @enum {string}
             */
            lostTo: "x" | "y";
            /** @description β of that plane on the curve. */
            characteristicExponent: number;
            points: {
                q: number;
                a: number;
            }[];
            /** @description How far, in a, the curve departs from straight lines through the points. */
            chordError: number;
        };
        RegionCorner: {
            a: number;
            q: number;
            /** @description U/V of the scan line through the corner. */
            dcToRfRatio: number;
        };
        /**
         * @description A stability region by its bands (n_x, n_y): first (0,0), second (1,1), third (1,0).
         * @enum {string}
         */
        RegionName: "first" | "second" | "third";
        /** @description How long ions stay in the field of a rod set. */
        Residence: components["schemas"]["ResidenceByEnergy"] | components["schemas"]["ResidenceByTime"] | components["schemas"]["ResidenceByCycles"];
        ResidenceByCycles: {
            /** @description RF cycles in the field, the same for every ion. */
            rfCycles: number;
        };
        ResidenceByEnergy: {
            /** @description Axial energy in the rods, in eV per charge. */
            axialEnergy_eVPerCharge: number;
        };
        ResidenceByTime: {
            /** @description Time in the field in us, the same for every ion. */
            flightTime_us: number;
        };
        Retention: {
            /** @description Start of the retention window in min. */
            start_min: number;
            /** @description End of the retention window in min. */
            end_min: number;
        };
        RetuneInterval: {
            /** @description Why there is no expected interval. drift-not-distinguishable: the slope is within its uncertainty at this confidence. A slope with its uncertainty needs three records. */
            reason: ("too-few-records" | "records-at-one-time" | "drift-not-distinguishable" | "limit-already-reached") | null;
            /** @description Drift in m/z per hour, by least squares. */
            slope_perHour: number | null;
            slopeStandardUncertainty_perHour: number | null;
            degreesOfFreedom: number;
            /** @description Hours after the last record until the line reaches the limit. */
            expected_h: number | null;
            /** @description Hours after the last record until the interval of a single offset reaches the limit; null beyond a century. */
            atConfidence_h: number | null;
        };
        /** @description An RF voltage with the convention in which it is stated. */
        Rf: {
            /** @description RF voltage in V, read as the members beside it say. */
            volts: number;
            /**
             * @description How the RF amplitude is read. No default: a wrong guess is a factor of two.
             * @enum {string}
             */
            as: "zero-to-peak" | "peak-to-peak" | "rms";
            /**
             * @description Between which points the voltage is taken. No default: a wrong guess is a factor of two.
             * @enum {string}
             */
            between: "pole-and-ground" | "pole-and-pole";
        };
        /** @description The laboratory's limits of rf-cycles. RF cycles N in the field, squared, over the resolution R of the window: the fewest that the method meets in a stage. */
        RfCyclesCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimit"];
            caution?: components["schemas"]["LowerLimit"];
        };
        RfOnlyAnswer: {
            /** @description m/z below which ions are lost; null without RF and above two pole pairs. */
            lowMassCutoff: number | null;
            /** @description The narrow window below the cutoff in which ions are stable again. */
            secondWindow: {
                mzLow: number;
                mzHigh: number;
            } | null;
            /** @description m/z above which the effective potential at 0.8 r0 is below maxRadialEnergy_eVPerCharge; null when that is not stated, because stability itself sets no upper limit without DC. */
            highMassLimit: number | null;
            results: components["schemas"]["RfOnlyResult"][];
        };
        RfOnlyRequest: {
            rodSet: components["schemas"]["RodSet"];
            drive: components["schemas"]["Drive"];
            /** @description 1 to 1000 ions; the results come back in the same order. */
            ions: components["schemas"]["Ion"][];
            /** @description Largest radial energy of an ion in eV per charge, for confined and highMassLimit. */
            maxRadialEnergy_eVPerCharge?: number;
        };
        RfOnlyResult: {
            mz: number;
            /** @description Mathieu parameter q; null above two pole pairs, where it is not defined. */
            q: number | null;
            /** @description null above two pole pairs, and where q is outside the computed domain. */
            stable: boolean | null;
            /** @description Effective potential at r0 in eV per charge; qV/4 in a quadrupole. */
            wellDepth_eVPerCharge: number;
            /** @description η at r0. The effective potential holds while it is small; 0.3 is a common limit. */
            adiabaticity: number;
            /** @description β f/2, exact; null when unstable and above two pole pairs. */
            secularFrequency_kHz: number | null;
            /** @description Whether the effective potential at 0.8 r0 exceeds maxRadialEnergy_eVPerCharge. null when that is not stated, and where η at 0.8 r0 is above 0.3, so that the effective potential proves nothing. */
            confined: boolean | null;
        };
        RodPotential: {
            dcToGround_V: number;
            /** @description Share of an RF cycle in which these rods are positive against ground. */
            positiveShare: number;
            /** @description Largest magnitude against ground. */
            peakToGround_V: number;
        };
        /** @description The geometry and the drive frequency of a rod set. */
        RodSet: {
            /** @description Field radius r0 in mm: half the gap between opposite rods, not the rod radius and not the diameter. */
            fieldRadius_mm: number;
            /** @description RF frequency f in MHz (not angular frequency). */
            frequency_MHz: number;
            /** @description Length of the rods in mm. */
            rodLength_mm?: number;
            /** @description Number of pole pairs: 2 is a quadrupole (when absent), 3 a hexapole, 4 an octopole. */
            polePairs?: number;
            waveform?: components["schemas"]["Waveform"];
        };
        Scan: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            /** @description id of a compound of the method. */
            compound?: string;
            /** @description The method's polarity when absent. */
            polarity?: components["schemas"]["Polarity"];
            /** @description Time between the step to this acquisition and its dwell, in ms. */
            pause_ms?: number;
            /** @description When it is acquired; always when absent. */
            retention?: components["schemas"]["Retention"];
            /** @description m/z at which the scan starts. */
            mzFrom: number;
            /** @description m/z at which the scan ends; above mzFrom. */
            mzTo: number;
            /** @description Scan rate in m/z per second. */
            rate_mzPerS: number;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            kind: "scan";
            /** @description Name of the mass filter that scans. */
            stage: string;
            /** @description Window that the method claims. */
            width?: components["schemas"]["Width"];
        };
        /** @description The laboratory's limits of scan-shift. How far the window of a scan moves while an ion is in the field, over the window's width. */
        ScanShiftCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["UpperLimit"];
            caution?: components["schemas"]["UpperLimit"];
        };
        ScanTableAnswer: {
            convention: components["schemas"]["VoltageConvention"];
            rows: components["schemas"]["ScanTableRow"][];
            /** @description Judged at 129 m/z evenly spaced in the logarithm, independent of the rows, where there is a set point. */
            lines: components["schemas"]["StraightScanLine"][];
            /** @description Why a line is missing. */
            linesReason: ("too-few-set-points" | "least-worst-width-not-converged") | null;
            /** @description The fastest rate that keeps the loss over all rows. From peak shapes at 228 RF cycles; the position of a peak holds only if calibrated at that rate. */
            fastest: {
                rate_mzPerS: number;
                /** @description The row that sets it. */
                mz: number;
                /** @description How far the window moves during the flight, over its width, for the permitted loss. */
                shiftOverWidth: number;
            } | null;
        };
        ScanTableRequest: {
            rodSet: components["schemas"]["RodSet"];
            convention: components["schemas"]["VoltageConvention"];
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            mzFrom: number;
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            mzTo: number;
            /** @description Rows, evenly spaced in m/z, both ends included. */
            points: number;
            /** @description Constant width in m/z, or constant resolution. */
            width: components["schemas"]["Width"];
            /** @description For the fastest scan rate. */
            residence?: components["schemas"]["Residence"];
            /** @description Share of the peak height that may be lost because the window moves during the flight; needed with residence. */
            permittedLoss?: number;
        };
        ScanTableRow: {
            mz: number;
            /** @description Calculated volts; not settings to apply. */
            drive: components["schemas"]["Drive"] | null;
            reason: ("width-height-needs-peak-profile" | "resolution-not-reachable" | "drive-out-of-range" | "not-converged") | null;
            a: number | null;
            q: number | null;
            mzLow: number | null;
            mzHigh: number | null;
            /** @description Fastest scan at this m/z for the permitted loss; null without residence. */
            fastestRate_mzPerS: number | null;
        };
        /** @description Shows that nothing was altered since; no person's electronic signature. */
        Seal: {
            /** @description JWS in compact form (RFC 7515), alg Ed25519 (RFC 9864), kid the RFC 7638 thumbprint of the key. Its payload is the canonical JSON of the digest that is sealed, in recordDigest, and of the time of sealing, in sealedAt (ISO 8601, UTC). */
            jws: string;
        };
        /** @description A JWK set (RFC 7517). */
        SealKeySet: {
            keys: components["schemas"]["PublicSealKey"][];
        };
        /**
         * @description valid: made with a key that this service knows, for this very content. invalid: altered, or made for another content. unknown-key: made with a key that this service does not know, so nothing can be said. absent: never sealed.
         * @enum {string}
         */
        SealState: "valid" | "invalid" | "unknown-key" | "absent";
        /** @description A sign-off that can be verified years later. It holds no clock but the one in the seal: the same request and version give the same record. */
        SealedRecord: {
            /**
             * @description Layout of the record.
             * @constant
             */
            format: 1;
            engine: components["schemas"]["Engine"];
            input: components["schemas"]["SignOffRequest"];
            result: components["schemas"]["SignOffResult"];
            digests: components["schemas"]["RecordDigests"];
            /** @description null where the service holds no key. */
            seal: components["schemas"]["Seal"] | null;
        };
        SelectedIon: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            /** @description id of a compound of the method. */
            compound?: string;
            /** @description The method's polarity when absent. */
            polarity?: components["schemas"]["Polarity"];
            /** @description Time between the step to this acquisition and its dwell, in ms. */
            pause_ms?: number;
            /** @description When it is acquired; always when absent. */
            retention?: components["schemas"]["Retention"];
            /** @enum {string} */
            use?: "quantifier" | "qualifier";
            /** @description Dwell time in ms. */
            dwell_ms?: number;
            /** @description Expected count rate at the lower limit, in counts per second. */
            countRate_perS?: number;
            neighbours?: components["schemas"]["Neighbour"][];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            kind: "selected-ion";
            /** @description Name of the mass filter that selects the ion. */
            stage: string;
            ion: components["schemas"]["Ion"];
            /** @description m/z set for the ion; its computed m/z when absent. */
            setMz?: number;
            /** @description Window that the method claims. */
            width?: components["schemas"]["Width"];
        };
        /** @description Shows that this installation computes as it should. It validates neither a method nor the laboratory's use of the service. */
        SelfCheckAnswer: {
            /**
             * @description pass when every capability is within its limit.
             * @enum {string}
             */
            outcome: "pass" | "fail";
            capabilities: components["schemas"]["CapabilityChecked"][];
            engine: components["schemas"]["Engine"];
            /** @description null where the service was not told what it runs on. */
            host: components["schemas"]["Host"] | null;
            /** @description SHA-256 of the canonical JSON (RFC 8785) of the four members above. */
            digest: string;
            /** @description With the time of the check; null where the service holds no key. */
            seal: components["schemas"]["Seal"] | null;
        };
        /** @description The laboratory's limits of set-mz. Distance of the set m/z from the m/z of the ion. */
        SetMzCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["UpperLimitByWidth"];
            caution?: components["schemas"]["UpperLimitByWidth"];
        };
        SetPoint: {
            mz: number;
            /** @description Calculated volts in the convention of the request; not settings to apply. */
            drive: components["schemas"]["Drive"] | null;
            /** @description The frequency that goes with these volts. */
            frequency_MHz: number | null;
            /** @description The duty cycle that goes with these volts; null with a sinusoid. */
            dutyCycle: number | null;
            /** @description Why there is no drive. width-height-needs-peak-profile: the width is not taken at the edges, which needs residence and beam, and is computed for volts, a sinusoid and the first region only. residence-too-short: even nearly closed edges leave the peak wider than that. no-such-peak: nothing passes such a window, or the peak has no flank that falls to this height. resolution-not-reachable: the region has no window so wide, or none so narrow is computed. needs-reversed-dc: the DC would have to have the other sign, which exchanges x and y: state the duty cycle 1 − d and the other tip. drive-out-of-range, frequency-out-of-range: beyond what a request may state. outside-computed-domain: the wave opens the window at a q beyond those that are computed. */
            reason: ("width-height-needs-peak-profile" | "residence-too-short" | "no-such-peak" | "resolution-not-reachable" | "needs-reversed-dc" | "drive-out-of-range" | "frequency-out-of-range" | "outside-computed-domain" | "not-converged") | null;
            /** @description a of the ion at the set point. */
            a: number | null;
            /** @description q of the ion at the set point. */
            q: number | null;
            /** @description What the calculated drive lets through. */
            passband: components["schemas"]["Passband"] | null;
        };
        SetPointsAnswer: {
            results: components["schemas"]["SetPoint"][];
        };
        SetPointsRequest: {
            rodSet: components["schemas"]["RodSet"];
            convention: components["schemas"]["VoltageConvention"];
            /** @description The region in which the window shall lie; the first when absent. */
            region?: components["schemas"]["RegionName"];
            /**
             * @description A window closes at two tips of its region, so that two U/V give the same resolution: towards the tip of largest U/V (when absent), or towards that of smallest U/V. In the third region these are (q, a) = (3.234, 3.164), the usual choice, and (2.815, 2.521). Those of the first and second region differ in nothing but the names x and y, so that with a sinusoid it has no effect there. With a rectangular wave: U/V above or below that of the open window.
             * @enum {string}
             */
            tip?: "high-ratio" | "low-ratio";
            /**
             * @description What puts the window on the ion: the RF volts at the frequency of the rod set (when absent), or the frequency at the RF volts of `rf`. The frequency of the rod set is then not used.
             * @enum {string}
             */
            solveFor?: "volts" | "frequency";
            /** @description The RF volts that are kept when the frequency is solved for. */
            rf?: components["schemas"]["Rf"];
            /**
             * @description What makes the width: the DC (when absent), or, with a DC-coupled rectangular wave, its duty cycle alone without DC. The duty cycle of the rod set is then not used, and that of the answer is above a half: x is the pair that is longer at the level with the sign of the ion.
             * @enum {string}
             */
            widthBy?: "dc" | "duty-cycle";
            /** @description Needed, with the beam, by widths at half or tenth height; not used by widths at the edges. */
            residence?: components["schemas"]["Residence"];
            /** @description Needed, with the residence, by widths at half or tenth height; not used by widths at the edges. */
            beam?: components["schemas"]["Beam"];
            /** @description Relative accuracy of widths at half or tenth height, 0.003 when absent. Widths at the edges are exact. */
            accuracy?: number;
            /** @description 1 to 1000 targets; the results come back in the same order. */
            targets: components["schemas"]["Target"][];
        };
        /** @description One ion in one stage, as the method sets it. */
        Setting: {
            /** @description JSON Pointer of the ion or of the end of a scan. */
            pointer: string;
            acquisition: string;
            stage: string;
            ion: string;
            mz: number;
            setMz: number;
            /** @description What the filter lets through, null where nothing passes or it is not known. */
            window: {
                mzLow: number;
                mzHigh: number;
                /**
                 * @description At which height the width is taken: between the stability edges, at half or at a tenth of the peak's height. No default: the three differ.
                 * @enum {string}
                 */
                at: "edges" | "half-height" | "tenth-height";
                evidence: components["schemas"]["Evidence"];
            } | null;
            /** @description Calculated volts, in the convention of the request; not settings to apply. */
            drive: components["schemas"]["Drive"] | null;
            /** @description Low-mass cutoff of the collision cell for this ion. */
            cutoffMz: number | null;
        };
        /** @description A value; objects, arrays and long texts as the start of their JSON. */
        ShownValue: string | number | boolean | null;
        SignOffAnswer: {
            verdict: components["schemas"]["Verdict"];
            verdictStatement: string;
            outcomeCounts: components["schemas"]["OutcomeCounts"];
            findings: components["schemas"]["Finding"][];
            settings: components["schemas"]["Setting"][];
            notShown: components["schemas"]["NotShown"][];
            waivers: components["schemas"]["WaivedCheck"][];
            /** @description The laboratory's criteria, null where the defaults were used. */
            criteria: {
                id: string;
                revision: string;
            } | null;
            record: components["schemas"]["SealedRecord"];
            cautions: string[];
        };
        SignOffRequest: {
            instrument: components["schemas"]["Instrument"];
            method: components["schemas"]["Method"];
            criteria?: components["schemas"]["Criteria"];
        };
        /** @description What a sign-off found: the part that goes on record. */
        SignOffResult: {
            verdict: components["schemas"]["Verdict"];
            verdictStatement: string;
            outcomeCounts: components["schemas"]["OutcomeCounts"];
            findings: components["schemas"]["Finding"][];
            settings: components["schemas"]["Setting"][];
            notShown: components["schemas"]["NotShown"][];
            waivers: components["schemas"]["WaivedCheck"][];
        };
        SinusoidWaveform: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            shape: "sinusoid";
        };
        StabilityAnswer: {
            results: components["schemas"]["StabilityResult"][];
        };
        StabilityOfIons: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            given: "ions";
            rodSet: components["schemas"]["RodSet"];
            drive: components["schemas"]["Drive"];
            /** @description 1 to 1000 ions; the results come back in the same order. */
            ions: components["schemas"]["Ion"][];
        };
        StabilityOfPoints: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            given: "points";
            waveform?: components["schemas"]["Waveform"];
            /** @description 1 to 1000 points; the results come back in the same order. */
            points: {
                /** @description Mathieu parameter a of the x plane, dimensionless. */
                a: number;
                /** @description Mathieu parameter q of the x plane, dimensionless. */
                q: number;
            }[];
        };
        StabilityRegionsAnswer: {
            box: {
                aMin: number;
                aMax: number;
                qMin: number;
                qMax: number;
            };
            /** @description Those of which some part lies inside the box. */
            regions: components["schemas"]["BoundedRegion"][];
            /** @description outside-computed-domain: the box reaches beyond |a| or q = 12, where further regions are not listed. POST /v1/stability judges single points there. */
            reason: "outside-computed-domain" | null;
        };
        StabilityRequest: components["schemas"]["StabilityOfIons"] | components["schemas"]["StabilityOfPoints"];
        StabilityResult: {
            /** @description null for a point. */
            mz: number | null;
            a: number;
            q: number;
            stable: boolean | null;
            reason: "outside-computed-domain" | null;
            /** @description The region of a stable ion. */
            region: components["schemas"]["Region"] | null;
            /** @description The rods that take an unstable ion; x are those whose DC has the sign of the ion. */
            lostTo: ("x" | "y" | "both") | null;
            x: components["schemas"]["PlaneStability"];
            y: components["schemas"]["PlaneStability"];
        };
        Stage: components["schemas"]["MassFilterStage"] | components["schemas"]["CollisionCellStage"] | components["schemas"]["IonGuideStage"] | components["schemas"]["IonTrapStage"];
        /** @description A straight line in place of the exact set points. */
        StraightScanLine: {
            /**
             * @description least-squares: of U over the judged m/z. least-worst-width: the line whose largest width error over them is least.
             * @enum {string}
             */
            sense: "least-squares" | "least-worst-width";
            /** @description U/V of the line, U and V between the same points and V zero-to-peak. */
            dcSlope: number;
            /** @description U = dcSlope V − dcOffset_V, in V between the points that the convention names for DC. */
            dcOffset_V: number;
            /** @description The m/z at which the width is furthest from the wanted one. */
            worst: {
                mz: number;
                wantedWidth: number;
                width: number | null;
                /** @description Width less the wanted width. */
                error: number | null;
                /** @description Centre of the window less m/z. */
                centreShift: number | null;
                /** @description above-apex: nothing passes. no-dc: the line asks for no DC, and the window has no upper end. */
                reason: ("above-apex" | "no-dc") | null;
            };
            /** @description The part of the range in which the line lies above the apex. */
            nothingPasses: {
                mzFrom: number;
                mzTo: number;
            } | null;
        };
        /** @description What a finding is about. */
        Subject: {
            /** @description JSON Pointer into the request. */
            pointer: string;
            acquisition?: string;
            stage?: string;
            /** @description Label of the ion, or its m/z. */
            ion?: string;
        };
        /** @description What the supply can reach. */
        Supply: {
            /** @description Largest RF voltage of the supply. */
            rfMax?: components["schemas"]["Rf"];
            /** @description Largest DC voltage of the supply. */
            dcMax?: components["schemas"]["Dc"];
        };
        /** @description The laboratory's limits of supply-headroom. What is left of the supply's largest voltage at the heaviest demand of the method, or of the rated m/z range. */
        SupplyHeadroomCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["LowerLimit"];
            caution?: components["schemas"]["LowerLimit"];
        };
        /** @description The ion on which a passband is centred, and how wide it is. */
        Target: {
            ion: components["schemas"]["Ion"];
            width: components["schemas"]["Width"];
        };
        Timing: components["schemas"]["TimingByDwell"] | components["schemas"]["TimingByCycle"];
        TimingByCycle: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            mode: "cycle";
            /** @description Wanted cycle time in ms, shared among the acquisitions of the moment. */
            cycle_ms: number;
            /** @description Shortest dwell time that is given, in ms. */
            dwellMin_ms: number;
            /** @description Longest dwell time that is given, in ms. */
            dwellMax_ms: number;
        };
        /** @description Every acquisition states its dwell time. */
        TimingByDwell: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            mode: "dwell";
        };
        /** @description What may move between two tunes. */
        Tolerances: {
            /** @description Relative tolerance, plus or minus, in ppm. */
            fieldRadius_ppm?: number;
            /** @description Relative tolerance, plus or minus, in ppm. */
            frequency_ppm?: number;
            /** @description U and V moving together, plus or minus, in ppm. */
            amplitude_ppm?: number;
            /** @description U against V, plus or minus, in ppm. */
            ratio_ppm?: number;
            /** @description Shift of the window between two tunes, plus or minus, in m/z. */
            mzDriftBetweenTunes?: number;
            /** @description Uncertainty of the m/z calibration, plus or minus, in m/z. */
            mzCalibration?: number;
        };
        TrajectoryAnswer: {
            mz: number;
            a: number;
            q: number;
            /** @description null outside the computed domain. */
            flight: {
                /** @description RF cycles in the field if the ion is not lost. */
                rfCycles: number;
                /** @description Equally spaced samples from the entrance, and a last one at the exit or where the ion is lost. */
                samples: {
                    time_us: number[];
                    x_mm: number[];
                    y_mm: number[];
                };
                envelope: {
                    x: components["schemas"]["TrajectoryEnvelope"];
                    y: components["schemas"]["TrajectoryEnvelope"];
                };
                /** @description Where |x| or |y| first reaches r0, found between the samples. */
                lost: {
                    /** @enum {string} */
                    to: "x" | "y";
                    at_us: number;
                    atCycle: number;
                    x_mm: number;
                    y_mm: number;
                } | null;
                end: {
                    time_us: number;
                    x_mm: number;
                    y_mm: number;
                    vx_mPerS: number;
                    vy_mPerS: number;
                };
            } | null;
            reason: "outside-computed-domain" | null;
            /** @description What stands on the rods. The rod offset counts where the drive states both pairs; else ground is the axis. */
            rods: {
                x: components["schemas"]["RodPotential"];
                y: components["schemas"]["RodPotential"];
                rodOffset_V: number | null;
            };
            /** @description null where no point was asked for. */
            fieldAt: {
                /** @description Against the axis. */
                potential_V: number;
                fieldX_VPerM: number;
                fieldY_VPerM: number;
                forceX_N: number;
                forceY_N: number;
            } | null;
        };
        TrajectoryEnvelope: {
            /** @description Largest distance from the axis during the flight. */
            largest_mm: number;
            at_us: number;
            /** @description Largest distance that an ion with this start could ever reach in a field without end; null where the motion is unstable. */
            largestEver_mm: number | null;
        };
        TrajectoryRequest: {
            rodSet: components["schemas"]["RodSet"];
            drive: components["schemas"]["Drive"];
            ion: components["schemas"]["Ion"];
            start: components["schemas"]["TrajectoryStart"];
            residence: components["schemas"]["Residence"];
            /** @description Samples in each RF cycle; at most 20,000 in all. */
            samplesPerCycle: number;
            /** @description A point at which to state potential, field and force. */
            fieldAt?: {
                /** @description Position in x, in mm from the axis. */
                x_mm: number;
                /** @description Position in y, in mm from the axis. */
                y_mm: number;
                /** @description RF phase in degrees. At 0 the RF on the x pair has the sign opposite to the ion's at its largest. */
                phase_deg: number;
            };
        };
        /** @description How the ion enters the field. */
        TrajectoryStart: {
            /** @description Position in x, in mm from the axis. */
            x_mm: number;
            /** @description Position in y, in mm from the axis. */
            y_mm: number;
            /** @description Velocity in x, in m/s. */
            vx_mPerS: number;
            /** @description Velocity in y, in m/s. */
            vy_mPerS: number;
            /** @description RF phase in degrees. At 0 the RF on the x pair has the sign opposite to the ion's at its largest. */
            phase_deg: number;
        };
        TransitAnswer: {
            results: components["schemas"]["TransitResult"][];
        };
        TransitRequest: {
            rodSet: components["schemas"]["RodSet"];
            residence: components["schemas"]["Residence"];
            /** @description 1 to 1000 ions; the results come back in the same order. */
            ions: components["schemas"]["Ion"][];
        };
        TransitResult: {
            mz: number;
            /** @description Time in the field in us. */
            flightTime_us: number;
            /** @description RF cycles N in the field. */
            rfCycles: number;
            /** @description N²/h for both constants h of the literature; neither is promised for a given beam. */
            attainableResolution: {
                h: number;
                resolution: number;
            }[];
        };
        Transition: {
            /** @description A name of the laboratory's own, no control characters. */
            id: string;
            /** @description A short text for people, no control characters. */
            label?: string;
            /** @description id of a compound of the method. */
            compound?: string;
            /** @description The method's polarity when absent. */
            polarity?: components["schemas"]["Polarity"];
            /** @description Time between the step to this acquisition and its dwell, in ms. */
            pause_ms?: number;
            /** @description When it is acquired; always when absent. */
            retention?: components["schemas"]["Retention"];
            /** @enum {string} */
            use?: "quantifier" | "qualifier";
            /** @description Dwell time in ms. */
            dwell_ms?: number;
            /** @description Expected count rate at the lower limit, in counts per second. */
            countRate_perS?: number;
            neighbours?: components["schemas"]["Neighbour"][];
            precursor: components["schemas"]["Ion"];
            /** @description m/z set for the precursor; its computed m/z when absent. */
            setPrecursorMz?: number;
            /** @description Window that the method claims for the precursor. */
            precursorWidth?: components["schemas"]["Width"];
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            kind: "transition";
            product: components["schemas"]["Ion"] | components["schemas"]["ProductByNeutralLoss"];
            /** @description m/z set for the product; its computed m/z when absent. */
            setProductMz?: number;
            /** @description Window that the method claims for the product. */
            productWidth?: components["schemas"]["Width"];
            cell?: components["schemas"]["CellSetting"];
        };
        TuneRecord: {
            /** @description When the tune was done, in hours after any instant. */
            time_h: number;
            /** @description Observed less set m/z at that tune. */
            offset: number;
        };
        TwoSidedLimit: {
            /** @description Smallest value, in the unit of the finding. */
            min: number;
            /** @description Largest value, in the unit of the finding. */
            max: number;
        };
        UpperLimit: {
            /** @description Largest value, in the unit of the finding. */
            max: number;
        };
        UpperLimitByWidth: components["schemas"]["UpperLimitInMz"] | components["schemas"]["UpperLimitOfWidth"];
        UpperLimitInMz: {
            /** @description Largest value in m/z. */
            max: number;
            /** @description Largest value as a fraction of the window's width. */
            maxOfWidth?: number;
        };
        UpperLimitOfWidth: {
            /** @description Largest value as a fraction of the window's width. */
            maxOfWidth: number;
        };
        /**
         * @description The worst outcome of the findings that count: fail, indeterminate, caution, pass.
         * @enum {string}
         */
        Verdict: "pass" | "caution" | "fail" | "indeterminate";
        VerificationAnswer: {
            /** @description What was found, for a person. */
            statement: string;
            /** @description Whether the digests fit the content. Without a valid seal that shows no more than that nothing was altered by accident: whoever alters a record can make new digests. */
            intact: boolean;
            /** @description JSON Pointers of what does not fit; empty where intact. */
            altered: string[];
            /** @description SHA-256 that the content on record has today, made anew: what a seal of it must name. */
            recordDigest: string;
            seal: components["schemas"]["SealState"];
            /** @description ISO 8601, UTC; null unless the seal is valid. */
            sealedAt: string | null;
            /** @description RFC 7638 thumbprint of the key that the seal names. */
            keyId: string | null;
            /** @description Whether this version finds the same from the same input: every number within the tolerance, everything else but sentences exactly. Where another version made the record, checks and members that it did not have are left out. */
            reproduced: boolean;
            notReproducedBecause: components["schemas"]["NotReproduced"] | null;
            differences: components["schemas"]["RecordDifference"][];
            differencesOmitted: number;
            /** @description Checks that this version has and the one that made the record had not. They count in verdict and not in reproduced. */
            checksAdded: string[];
            /** @description Relative to the larger of two numbers. A margin is measured on the scale of the value and the bounds it is the difference of, a difference of two m/z on that of the m/z. */
            tolerance: number;
            /** @description Verdict that this version comes to by the criteria on record; null where it can come to none. */
            verdict: components["schemas"]["Verdict"] | null;
            /** @description Verdict by the criteria of this request; null where it states none. */
            verdictByCriteria: components["schemas"]["Verdict"] | null;
            /** @description Whether the verdict, by the criteria of this request or else by those on record, is pass or caution. */
            stillMeetsCriteria: boolean | null;
            /** @description What recomputed. */
            engine: components["schemas"]["Engine"];
        };
        VerificationRequest: {
            record: components["schemas"]["KeptRecord"];
            /** @description Criteria to hold the method to today, in place of those on record. */
            criteria?: components["schemas"]["Criteria"];
        };
        /** @description How the voltages of the answer are to be read. */
        VoltageConvention: {
            rf: {
                /**
                 * @description How the RF amplitude is read. No default: a wrong guess is a factor of two.
                 * @enum {string}
                 */
                as: "zero-to-peak" | "peak-to-peak" | "rms";
                /**
                 * @description Between which points the voltage is taken. No default: a wrong guess is a factor of two.
                 * @enum {string}
                 */
                between: "pole-and-ground" | "pole-and-pole";
            };
            dc: {
                /**
                 * @description Between which points the voltage is taken. No default: a wrong guess is a factor of two.
                 * @enum {string}
                 */
                between: "pole-and-ground" | "pole-and-pole";
            };
        };
        /** @description The laboratory's limits of voltage-convention. m/z that the stated RF voltage puts at the apex of the stability region, over the m/z it is stated for. */
        VoltageConventionCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["TwoSidedLimit"];
            caution?: components["schemas"]["TwoSidedLimit"];
        };
        /** @description A check that the laboratory's criteria take out of the verdict. */
        WaivedCheck: {
            check: string;
            worstOutcome: ("pass" | "caution" | "fail" | "indeterminate") | null;
            reason: string;
            reference: string;
        };
        /** @description The check no longer counts in the verdict; its findings keep their outcome and the waiver is listed. */
        Waiver: {
            /** @description A text for people, no control characters. */
            reason: string;
            /** @description Where the laboratory's decision is kept. */
            reference: string;
        };
        /** @description Shape of the RF voltage; a sinusoid when absent. */
        Waveform: components["schemas"]["SinusoidWaveform"] | components["schemas"]["RectangularWaveform"];
        /** @description Width of a mass window, with the height at which it is taken. */
        Width: {
            /** @description The width in m/z, or the resolution m/width. */
            value: number;
            /** @enum {string} */
            as: "mz" | "resolution";
            /**
             * @description At which height the width is taken: between the stability edges, at half or at a tenth of the peak's height. No default: the three differ.
             * @enum {string}
             */
            at: "edges" | "half-height" | "tenth-height";
        };
        /** @description The laboratory's limits of window-width. Difference in m/z between the width that is observed or computed and the width that the method claims. */
        WindowWidthCriterion: {
            /** @description Whether the check counts in the verdict, also where it is indeterminate. */
            required?: boolean;
            waiver?: components["schemas"]["Waiver"];
            pass?: components["schemas"]["UpperLimit"];
            caution?: components["schemas"]["UpperLimit"];
        };
    };
    responses: never;
    parameters: never;
    requestBodies: never;
    headers: {
        /** @description Name of this request in the service's log; the caller's own if it sent one of 8 to 64 plain characters. */
        RequestId: string;
    };
    pathItems: never;
}
export type $defs = Record<string, never>;
export interface operations {
    stability: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description Whether ions or points (a, q) are stable, and which rods take them if not */
        requestBody: {
            content: {
                "application/json": components["schemas"]["StabilityRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["StabilityAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    stabilityRegions: {
        parameters: {
            query?: {
                /** @description Lower edge of the box in a; -12 when absent. */
                aMin?: number;
                /** @description Upper edge of the box in a, above aMin; 12 when absent. */
                aMax?: number;
                /** @description Left edge of the box in q; 0 when absent. */
                qMin?: number;
                /** @description Right edge of the box in q, above qMin; 12 when absent. */
                qMax?: number;
                /** @description Points on each side of a region, both corners included; 17 when absent. */
                pointsPerArc?: number;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["StabilityRegionsAnswer"];
                    "image/svg+xml": string;
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where. */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    mathieuParameters: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description a and q of an ion, and every quantity that follows from them */
        requestBody: {
            content: {
                "application/json": components["schemas"]["MathieuParametersRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["MathieuParametersAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    rfOnly: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description Which ions an RF-only rod set guides, and how firmly */
        requestBody: {
            content: {
                "application/json": components["schemas"]["RfOnlyRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["RfOnlyAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    transit: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description How long ions stay in the field, and the resolution that this allows */
        requestBody: {
            content: {
                "application/json": components["schemas"]["TransitRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["TransitAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    trajectory: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description The path of one ion, where and when it is lost, and what stands on the rods */
        requestBody: {
            content: {
                "application/json": components["schemas"]["TrajectoryRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["TrajectoryAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    passband: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description The m/z that a mass filter lets through */
        requestBody: {
            content: {
                "application/json": components["schemas"]["PassbandRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["PassbandAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where. */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    setPoints: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description The RF and DC, or the frequency, that give passbands of wanted position and width */
        requestBody: {
            content: {
                "application/json": components["schemas"]["SetPointsRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SetPointsAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    peakProfile: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description The share of a beam that passes against m/z, and position, height and widths of the peak */
        requestBody: {
            content: {
                "application/json": components["schemas"]["PeakProfileRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["PeakProfileAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    scanTable: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description Set points over a range, the straight line in their place, and the fastest scan */
        requestBody: {
            content: {
                "application/json": components["schemas"]["ScanTableRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ScanTableAnswer"];
                    "text/csv": string;
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    driftBudget: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description What tolerances do to a window, what they may be, and when to tune again */
        requestBody: {
            content: {
                "application/json": components["schemas"]["DriftBudgetRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["DriftBudgetAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where. */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    mzCalibration: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description Position and width of measured peaks as a line, what each peak pulls, and what to expect between */
        requestBody: {
            content: {
                "application/json": components["schemas"]["MzCalibrationRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["MzCalibrationAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where. */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    signOff: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description Whether the mass-filter settings of a method can do what it claims, on paper */
        requestBody: {
            content: {
                "application/json": components["schemas"]["SignOffRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SignOffAnswer"];
                    "text/html": string;
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    signOffVerification: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description Whether a record still holds: unaltered, sealed, and the same found from the same input today */
        requestBody: {
            content: {
                "application/json": components["schemas"]["VerificationRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["VerificationAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where. */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    signOffComparison: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** @description What a transfer to another instrument, or a revision of method, instrument or criteria, changes */
        requestBody: {
            content: {
                "application/json": components["schemas"]["ComparisonRequest"];
            };
        };
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ComparisonAnswer"];
                };
            };
            /**
             * @description `malformed-json`: The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.
             *
             *     `interrupted-body`: The connection ended, or fewer bytes came than Content-Length announced.
             */
            400: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `body-too-large`: The body is larger than the limit that GET /v1/about shows. */
            413: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `unsupported-media-type`: Content-Type is not application/json (with or without charset=utf-8), or the body is compressed. */
            415: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /**
             * @description `invalid-request`: The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.
             *
             *     `too-much-work`: Each part is valid, but together they cost more than one request may.
             */
            422: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    signOffChecks: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Catalogue"];
                    "text/markdown": string;
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    selfCheck: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SelfCheckAnswer"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    sealKeys: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SealKeySet"];
                    "application/jwk-set+json": string;
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    about: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["About"];
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    problems: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description The answer. */
            200: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ProblemCatalogue"];
                    "text/markdown": string;
                };
            };
            /** @description `not-acceptable`: The Accept header admits none of the media types in which this endpoint answers. */
            406: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description `internal-error`: A defect of the service, never a property of the request's numbers. Nothing was computed. */
            500: {
                headers: {
                    "X-Request-Id": components["headers"]["RequestId"];
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
}
