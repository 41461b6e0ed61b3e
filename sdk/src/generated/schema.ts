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
         * @description Solves the Mathieu equation in both planes. a and q belong to x, −a and −q to y. Beyond |a| or q of 100 nothing is computed and reason says so. Stable means bounded for ever in an ideal field, not that the ion fits between the rods.
         */
        post: operations["stability"];
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
         * @description Where the scan line a/q = 2U/V enters and leaves the first stability region, exactly. The edge at low m/z is β_x = 1 (light ions are lost to the x rods), the edge at high m/z is β_y = 0. Real peaks are narrower or wider than the distance of the edges, by residence and beam.
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
         * The RF and DC that give passbands of wanted position and width
         * @description The inverse of the passband, solved exactly: the passband of the calculated volts is centred on the m/z of the ion and as wide as asked. Calculated volts are not settings to apply, and they may exceed any supply.
         */
        post: operations["setPoints"];
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
                /** @description Largest request body in kB (1000 bytes). */
                body_kB: number;
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
            /** @description Mean radial energy of both axes, in eV per charge. */
            meanRadialEnergy_eVPerCharge: number;
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
        /** @description The voltages on a rod set. x is the pair whose DC has the sign of the ion. */
        Drive: {
            rf: components["schemas"]["Rf"];
            /** @description Absent means RF-only. */
            dc?: components["schemas"]["Dc"];
        };
        /** @description One thing that is wrong with a request, and where. */
        ErrorOfMember: {
            /** @description JSON Pointer (RFC 6901) to the member; empty for the body. */
            pointer: string;
            /** @enum {string} */
            code: "unknown-member" | "missing-member" | "wrong-type" | "not-whole" | "out-of-range" | "not-one-of" | "wrong-length" | "wrong-count" | "wrong-format" | "not-unique" | "not-found" | "not-above" | "not-below" | "charge-is-zero" | "charge-against-polarity" | "limits-crossed" | "stages-do-not-fit" | "needs-two-pole-pairs" | "dc-not-taken" | "ion-trap-not-computed" | "formula-not-computed" | "waveform-not-computed" | "region-not-computed";
            /** @description What was found and what is expected, for a person. */
            detail: string;
        };
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
        };
        /** @description An ion, by its m/z or by formula and adduct. */
        Ion: components["schemas"]["IonByMz"] | components["schemas"]["IonByFormula"];
        IonByFormula: {
            /** @description A molecular formula, such as C33H40N2O9. */
            formula: string;
            /** @description The adduct in brackets with its charge, such as [M+H]+. */
            adduct: string;
            /** @description A short text for people, 1 to 200 characters, no control characters. */
            label?: string;
            /** @enum {string} */
            isotopologue?: "monoisotopic" | "most-abundant";
        };
        IonByMz: {
            /** @description Mass-to-charge ratio m/z of the ion, dimensionless. */
            mz: number;
            /** @description Charge number with sign; 1 or -1 by the polarity when absent. Zero is refused. */
            charge?: number;
            /** @description A short text for people, 1 to 200 characters, no control characters. */
            label?: string;
        };
        /** @description Parts of a limit, as criteria state them: min, max, minOfWidth and the like. */
        LimitShown: {
            [key: string]: number;
        };
        MathieuParametersAnswer: components["schemas"]["FoundParameters"] | components["schemas"]["FoundDrive"] | components["schemas"]["FoundMz"] | components["schemas"]["FoundFrequency"] | components["schemas"]["FoundFieldRadius"];
        MathieuParametersRequest: components["schemas"]["FindParameters"] | components["schemas"]["FindDrive"] | components["schemas"]["FindMz"] | components["schemas"]["FindFrequency"] | components["schemas"]["FindFieldRadius"];
        /** @description The m/z that are stable in both planes in an ideal field after any number of RF cycles. */
        Passband: {
            region: components["schemas"]["RegionName"];
            /** @description m/z of the edge below which ions are lost. */
            mzLow: number;
            /** @description m/z of the edge above which ions are lost; null when there is no DC, so no upper edge. */
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
            /** @description Empty when nothing passes; reason says why. */
            passbands: components["schemas"]["Passband"][];
            /** @description Why there is no passband. width-height-needs-peak-profile: the width is not taken at the edges, and this version cannot convert it. */
            reason: ("above-apex" | "no-rf" | "width-height-needs-peak-profile" | "resolution-not-reachable" | "not-converged") | null;
            /** @description U/V, both pole-to-ground, V zero-to-peak; null without RF. */
            dcToRfRatio: number | null;
            /** @description U/V at which the first region closes. */
            apexRatio: number;
            /** @description How far U/V lies below the apex, in ppm of the apex; negative above it. */
            apexMargin_ppm: number | null;
        };
        /** @description Where the scan line leaves the region. */
        PassbandEdge: {
            a: number;
            q: number;
            /**
             * @description The rods that take an ion just outside this edge: light ions x, heavy ions y.
             * @enum {string}
             */
            lostTo: "x" | "y";
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
        RectangularWaveform: {
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            shape: "rectangular";
            /** @description Fraction of a period at the positive level on the x pair. */
            dutyCycle: number;
            /**
             * @description dc: the mean of the wave reaches the rods and acts as DC; ac: it does not.
             * @enum {string}
             */
            coupling: "dc" | "ac";
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
        SetPoint: {
            mz: number;
            /** @description Calculated volts in the convention of the request; not settings to apply. */
            drive: components["schemas"]["Drive"] | null;
            /** @description Why there is no drive. width-height-needs-peak-profile: the width is not taken at the edges, and this version cannot convert it. resolution-not-reachable: no window of the first region is wider than twice its m/z. drive-out-of-range: the volts are beyond what a request may state. */
            reason: ("width-height-needs-peak-profile" | "resolution-not-reachable" | "drive-out-of-range" | "not-converged") | null;
            /** @description a of the ion at the set point. */
            a: number | null;
            /** @description q of the ion at the set point. */
            q: number | null;
            /** @description What the calculated volts let through. */
            passband: components["schemas"]["Passband"] | null;
        };
        SetPointsAnswer: {
            results: components["schemas"]["SetPoint"][];
        };
        SetPointsRequest: {
            rodSet: components["schemas"]["RodSet"];
            convention: components["schemas"]["VoltageConvention"];
            /**
             * @description The region in which to look; the first when absent.
             * @enum {string}
             */
            region?: "first" | "second" | "third" | "any";
            /** @description Not used by widths taken at the edges. */
            residence?: components["schemas"]["Residence"];
            /** @description Not used by widths taken at the edges. */
            beam?: components["schemas"]["Beam"];
            /** @description 1 to 1000 targets; the results come back in the same order. */
            targets: components["schemas"]["Target"][];
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
        StabilityRequest: components["schemas"]["StabilityOfIons"] | components["schemas"]["StabilityOfPoints"];
        StabilityResult: {
            /** @description null for a point. */
            mz: number | null;
            a: number;
            q: number;
            stable: boolean | null;
            reason: "outside-computed-domain" | null;
            /** @description The bands n_x and n_y of a stable ion, and the name of the region if it has one. */
            region: {
                x: number;
                y: number;
                name: components["schemas"]["RegionName"] | null;
            } | null;
            /** @description The rods that take an unstable ion; x are those whose DC has the sign of the ion. */
            lostTo: ("x" | "y" | "both") | null;
            x: components["schemas"]["PlaneStability"];
            y: components["schemas"]["PlaneStability"];
        };
        /** @description The ion on which a passband is centred, and how wide it is. */
        Target: {
            ion: components["schemas"]["Ion"];
            width: components["schemas"]["Width"];
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
             * @description `invalid-request`: The body is JSON but breaks the request schema, or a rule between its members. `errors` says where.
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
             * @description `invalid-request`: The body is JSON but breaks the request schema, or a rule between its members. `errors` says where.
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
             * @description `invalid-request`: The body is JSON but breaks the request schema, or a rule between its members. `errors` says where.
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
             * @description `invalid-request`: The body is JSON but breaks the request schema, or a rule between its members. `errors` says where.
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
            /** @description `invalid-request`: The body is JSON but breaks the request schema, or a rule between its members. `errors` says where. */
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
        /** @description The RF and DC that give passbands of wanted position and width */
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
             * @description `invalid-request`: The body is JSON but breaks the request schema, or a rule between its members. `errors` says where.
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
