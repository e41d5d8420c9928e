/* Generated from openapi.yaml by `npm run contract`; do not edit. */
export interface paths {
    "/convert": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Convert attitudes between two conventions
         * @description Up to 100,000 attitudes a JSON call. One bad attitude refuses the batch and names every bad index (first 100). 90 given in degrees is exact gimbal lock; the double nearest to π/2 given in radians is not.
         *
         *     Body and answer may also be rows alone, any of these to any: application/x-ndjson (an array a line; the answer's last line is an object with count and warnings), text/csv (RFC 4180; `header=present` where the first line names the columns) and application/octet-stream (little-endian float64, nothing between the rows). Content-Type and Accept choose; conventions stand in the query. Rows to rows are streamed, as many as the month's quota allows: read while you send. With JSON on one side the call is a batch like any other.
         *
         *     What is wrong in the first MiB is refused with a problem document. A bad row further on ends the answer where its row would stand: NDJSON with `{"problem":{…,"row":n}}`, CSV with a line `problem,<code>,<row>,"<detail>"`, float64 with a row of NaN; the trailer Dextral-Problem says `<code>;row=<n>`, and the history keeps it. The rows before it were answered and are metered. Trailer Dextral-Warnings counts warnings by code.
         *
         *     Roles: administrator, integrator, engineer.
         */
        post: operations["convertAttitudes"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/rates": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Convert rates between two forms, each at its attitude
         * @description Up to 100,000 samples a call.
         *
         *     Roles: administrator, integrator, engineer.
         */
        post: operations["convertRates"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/verify": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Verify attitudes that code computed against expected ones
         * @description The error is the angle of the rotation between the two attitudes, never a difference of angles. The verdict is kept as a run.
         *
         *     Roles: administrator, integrator, engineer.
         */
        post: operations["verifyAttitudes"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/verify-rates": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Verify rates that code computed against expected ones
         * @description The error is the length of the difference of the two angular velocities, whatever forms the rates come in; never a difference of Euler rates. The verdict is kept as a run.
         *
         *     Roles: administrator, integrator, engineer.
         */
        post: operations["verifyRates"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/identify": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Find every convention that a box’s numbers may follow
         * @description Compares the numbers with trusted attitudes under every reading, axis set, order, sign and unit, and with constant offsets, a time lag and a scale. Says what explains them, what else would, what the data cannot tell, and which attitude to test next. Rates are compared with those of the reference attitudes, which takes their times.
         *
         *     Roles: administrator, integrator, engineer.
         */
        post: operations["identifyConvention"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/resolve": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Resolve vectors between reference and body axes, and their derivatives by the transport theorem
         * @description Seen from the reference a vector changes by ω × v more than seen from the body. Up to 100,000 samples a call.
         *
         *     Roles: administrator, integrator, engineer.
         */
        post: operations["resolveVectors"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/rigid-body": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Forces and moments that a rigid body’s motion takes, in body axes
         * @description Newton’s and Euler’s equations. An inertia matrix that no body can have is refused. Up to 100,000 states a call; each counts as an attitude.
         *
         *     Roles: administrator, integrator, engineer.
         */
        post: operations["computeRigidBody"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/runs": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * Runs, newest first
         * @description Roles: administrator, integrator, engineer (their own), reviewer.
         */
        get: operations["listRuns"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/runs/{id}.junit.xml": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * One run as JUnit XML, for a build’s test report
         * @description Roles: administrator, integrator, engineer (their own), reviewer.
         */
        get: operations["getRunAsJUnit"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/runs/{id}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * One run
         * @description Roles: administrator, integrator, engineer (their own), reviewer.
         */
        get: operations["getRun"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/conventions": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * List the presets
         * @description Roles: administrator, integrator, engineer, reviewer.
         */
        get: operations["listConventions"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/conventions/{id}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * One preset with every facet
         * @description Roles: administrator, integrator, engineer, reviewer.
         */
        get: operations["getConvention"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/keys": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * List API keys, newest first
         * @description Roles: administrator, integrator (their own), engineer (their own).
         */
        get: operations["listKeys"];
        put?: never;
        /**
         * Issue an API key; its secret is in this answer only
         * @description Roles: administrator.
         */
        post: operations["issueKey"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/keys/{id}/revoke": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /**
         * Revoke an API key; the next call with it is refused
         * @description Roles: administrator.
         */
        post: operations["revokeKey"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/keys/{id}/limits": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        /**
         * Give a key tighter limits than its role
         * @description Roles: administrator.
         */
        put: operations["changeKeyLimits"];
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/history": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * API calls, newest first
         * @description Every API call is one entry, refused ones included. A person whose role reaches only their own sees the calls of their keys and their own.
         *
         *     A filter that few entries pass is searched in steps: a page may hold fewer entries than asked for, even none, and still have a `nextCursor`; the search then goes on from there.
         *
         *     Roles: administrator, integrator, engineer (their own), reviewer.
         */
        get: operations["listHistory"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/history.csv": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * API calls as CSV, newest first
         * @description The whole history that passes the filter, as RFC 4180 with a header row. A text that a spreadsheet would take for a formula has an apostrophe in front.
         *
         *     Roles: administrator, integrator, engineer (their own), reviewer.
         */
        get: operations["exportHistory"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/history/settings": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * What the history keeps, and for how long
         * @description Roles: administrator, integrator, engineer (their own), reviewer.
         */
        get: operations["getHistorySettings"];
        /**
         * Change what the history keeps; in force on the next call
         * @description Roles: administrator.
         */
        put: operations["changeHistorySettings"];
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/history/{id}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * One API call, with its body where that is kept
         * @description Roles: administrator, integrator, engineer (their own), reviewer.
         */
        get: operations["getHistoryEntry"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/usage": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * What the caller has used this month, and what is left
         * @description Units are attitudes computed; refused requests cost none.
         *
         *     For anybody signed in.
         */
        get: operations["ownUsage"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/usage/keys": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * What each key has used in a month, and each role
         * @description Roles: administrator, integrator (their own), engineer (their own), reviewer.
         */
        get: operations["usageByKey"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/limits": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /**
         * Limits of every role
         * @description Roles: administrator, integrator, engineer, reviewer.
         */
        get: operations["listLimits"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/limits/{role}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        /**
         * Change the limits of a role; in force on the next request
         * @description Roles: administrator.
         */
        put: operations["changeLimits"];
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/sessions": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Sign in; the session is kept in a cookie */
        post: operations["signIn"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/sessions/current": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Who is signed in, if anybody */
        get: operations["currentSession"];
        put?: never;
        post?: never;
        /**
         * Sign out
         * @description For anybody signed in.
         */
        delete: operations["signOut"];
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/health": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Whether the service answers and can write */
        get: operations["health"];
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
        ApiKey: {
            id: string;
            name: string;
            /** @description The part of the key that may be shown; enough to recognise it. */
            prefix: string;
            role: components["schemas"]["Role"];
            /**
             * Format: date-time
             * @example 2026-05-04T08:30:00.000Z
             */
            createdAt: string;
            createdBy: {
                id: string;
                name: string;
            };
            expiresAt: string | null;
            lastUsedAt: string | null;
            revokedAt: string | null;
        };
        AttitudeRun: {
            /** @constant */
            kind: "attitudes";
            id: string;
            /**
             * Format: date-time
             * @example 2026-05-04T08:30:00.000Z
             */
            at: string;
            /** @enum {string} */
            verdict: "pass" | "fail";
            label: string | null;
            commit: string | null;
            key: {
                id: string;
                name: string;
            } | null;
            person: {
                id: string;
                name: string;
            } | null;
            count: number;
            failed: number;
            summary: string;
            engine: string;
            tolerance: components["schemas"]["Tolerance"];
            worst: components["schemas"]["WorstError"];
            statistics: components["schemas"]["ErrorStatistics"];
            expected: components["schemas"]["ConventionFacets"];
            actual: components["schemas"]["ConventionFacets"];
            /** @description The first 100 attitudes off by more than the tolerance, with the angle in its unit. */
            failures: {
                index: number;
                angle: number;
            }[];
            /** @description Where one was asked for and the verdict is fail; at most the ten plainest explanations are kept. */
            diagnosis?: components["schemas"]["Identification"];
        };
        /** @description A constant rotation T = R(axis, angle) on one side: the numbers mean C T (reference) or T C (body) where C is the true attitude. */
        ConstantOffset: {
            /** @enum {string} */
            side: "reference" | "body";
            /** @description Unit axis: in north, east, down (or the named frame) for the reference side, in forward, right, down for the body side. */
            axis: [
                number,
                number,
                number
            ];
            angle: number;
            /** @enum {string} */
            unit: "deg" | "rad";
        };
        /** @description Every facet, a preset id, or a published interface version. */
        Convention: components["schemas"]["ConventionFacets"] | components["schemas"]["PresetReference"] | components["schemas"]["InterfaceReference"];
        /** @description A convention with every facet stated. Nothing has a default. */
        ConventionFacets: {
            /** @constant */
            representation: "euler";
            /**
             * @description Reference axes, x then y then z: NED, ENU, NWU … (one of N/S, one of E/W, one of U/D, in any order), or a named frame such as ECEF.
             * @example NED
             */
            reference: string;
            /**
             * @description Body axes, x then y then z: FRD, FLU … (one of F/B, one of R/L, one of U/D, in any order).
             * @example FRD
             */
            body: string;
            /**
             * @description Axes of the successive rotations, in the order applied.
             * @enum {string}
             */
            sequence: "XYZ" | "YZX" | "ZXY" | "XZY" | "YXZ" | "ZYX" | "XYX" | "XZX" | "YXY" | "YZY" | "ZXZ" | "ZYZ";
            /** @enum {string} */
            motion: "intrinsic" | "extrinsic";
            /** @enum {string} */
            unit: "deg" | "rad";
            /**
             * @description order[i] is the number of the applied rotation whose angle stands i-th in the list: [1,2,3] is the order applied.
             * @example [
             *       1,
             *       2,
             *       3
             *     ]
             */
            order: [
                1 | 2 | 3,
                1 | 2 | 3,
                1 | 2 | 3
            ];
            /**
             * @description Number listed = sign × angle; aligned with the applied order.
             * @example [
             *       1,
             *       1,
             *       1
             *     ]
             */
            signs: [
                1 | -1,
                1 | -1,
                1 | -1
            ];
            /**
             * @description Of the first applied angle on output: signed (−180, 180] or positive [0, 360).
             * @enum {string}
             */
            range: "signed" | "positive";
        } | {
            /** @constant */
            representation: "quaternion";
            /**
             * @description Reference axes, x then y then z: NED, ENU, NWU … (one of N/S, one of E/W, one of U/D, in any order), or a named frame such as ECEF.
             * @example NED
             */
            reference: string;
            /**
             * @description Body axes, x then y then z: FRD, FLU … (one of F/B, one of R/L, one of U/D, in any order).
             * @example FRD
             */
            body: string;
            /** @enum {string} */
            scalar: "first" | "last";
            /** @enum {string} */
            product: "hamilton" | "shuster";
            /**
             * @description dcm: body-to-reference is v_ref = M v_body. quaternion (hamilton): body-to-reference is v_ref = R(q) v_body. The others: as the Hamilton quaternion (cos a/2, n sin a/2).
             * @enum {string}
             */
            maps: "body-to-reference" | "reference-to-body";
            /**
             * @description Binds output only.
             * @enum {string}
             */
            sign: "any" | "scalar-non-negative" | "continuous";
        } | {
            /** @constant */
            representation: "dcm";
            /**
             * @description Reference axes, x then y then z: NED, ENU, NWU … (one of N/S, one of E/W, one of U/D, in any order), or a named frame such as ECEF.
             * @example NED
             */
            reference: string;
            /**
             * @description Body axes, x then y then z: FRD, FLU … (one of F/B, one of R/L, one of U/D, in any order).
             * @example FRD
             */
            body: string;
            /**
             * @description dcm: body-to-reference is v_ref = M v_body. quaternion (hamilton): body-to-reference is v_ref = R(q) v_body. The others: as the Hamilton quaternion (cos a/2, n sin a/2).
             * @enum {string}
             */
            maps: "body-to-reference" | "reference-to-body";
            /** @enum {string} */
            layout: "row-major" | "column-major";
        } | {
            /** @constant */
            representation: "rotation-vector";
            /**
             * @description Reference axes, x then y then z: NED, ENU, NWU … (one of N/S, one of E/W, one of U/D, in any order), or a named frame such as ECEF.
             * @example NED
             */
            reference: string;
            /**
             * @description Body axes, x then y then z: FRD, FLU … (one of F/B, one of R/L, one of U/D, in any order).
             * @example FRD
             */
            body: string;
            /**
             * @description dcm: body-to-reference is v_ref = M v_body. quaternion (hamilton): body-to-reference is v_ref = R(q) v_body. The others: as the Hamilton quaternion (cos a/2, n sin a/2).
             * @enum {string}
             */
            maps: "body-to-reference" | "reference-to-body";
            /** @enum {string} */
            unit: "deg" | "rad";
        } | {
            /** @constant */
            representation: "axis-angle";
            /**
             * @description Reference axes, x then y then z: NED, ENU, NWU … (one of N/S, one of E/W, one of U/D, in any order), or a named frame such as ECEF.
             * @example NED
             */
            reference: string;
            /**
             * @description Body axes, x then y then z: FRD, FLU … (one of F/B, one of R/L, one of U/D, in any order).
             * @example FRD
             */
            body: string;
            /**
             * @description dcm: body-to-reference is v_ref = M v_body. quaternion (hamilton): body-to-reference is v_ref = R(q) v_body. The others: as the Hamilton quaternion (cos a/2, n sin a/2).
             * @enum {string}
             */
            maps: "body-to-reference" | "reference-to-body";
            /** @enum {string} */
            unit: "deg" | "rad";
        } | {
            /** @constant */
            representation: "mrp";
            /**
             * @description Reference axes, x then y then z: NED, ENU, NWU … (one of N/S, one of E/W, one of U/D, in any order), or a named frame such as ECEF.
             * @example NED
             */
            reference: string;
            /**
             * @description Body axes, x then y then z: FRD, FLU … (one of F/B, one of R/L, one of U/D, in any order).
             * @example FRD
             */
            body: string;
            /**
             * @description dcm: body-to-reference is v_ref = M v_body. quaternion (hamilton): body-to-reference is v_ref = R(q) v_body. The others: as the Hamilton quaternion (cos a/2, n sin a/2).
             * @enum {string}
             */
            maps: "body-to-reference" | "reference-to-body";
            /** @enum {string} */
            shadow: "inside" | "any";
        } | {
            /** @constant */
            representation: "gibbs";
            /**
             * @description Reference axes, x then y then z: NED, ENU, NWU … (one of N/S, one of E/W, one of U/D, in any order), or a named frame such as ECEF.
             * @example NED
             */
            reference: string;
            /**
             * @description Body axes, x then y then z: FRD, FLU … (one of F/B, one of R/L, one of U/D, in any order).
             * @example FRD
             */
            body: string;
            /**
             * @description dcm: body-to-reference is v_ref = M v_body. quaternion (hamilton): body-to-reference is v_ref = R(q) v_body. The others: as the Hamilton quaternion (cos a/2, n sin a/2).
             * @enum {string}
             */
            maps: "body-to-reference" | "reference-to-body";
        };
        ConvertInput: {
            from: components["schemas"]["Convention"];
            to: components["schemas"]["Convention"];
            /** @description One array of numbers per attitude, in the count and order that the convention states. A row-major matrix may also stand as three rows of three. */
            attitudes: (number | number[])[][];
            options?: {
                /** @description Also say each attitude in a plain sentence. */
                readings?: boolean;
                /** @description Compute every answer again by independent code, in 64-digit arithmetic and with a general-purpose package, and report the differences. At most 1,000 attitudes; it takes some milliseconds each. */
                crossCheck?: boolean;
                /**
                 * @description What to do with numbers that are no rotation by more than 1e-6: refuse them (none, the policy when absent) or take the nearest rotation.
                 * @enum {string}
                 */
                repair?: "none" | "nearest";
                /** @description Warn when an attitude comes closer to gimbal lock than this; 1° when absent. */
                warnWithinDeg?: number;
            };
        };
        ConvertOutput: {
            attitudes: number[][];
            from: components["schemas"]["ConventionFacets"];
            to: components["schemas"]["ConventionFacets"];
            warnings: components["schemas"]["Warning"][];
            /** @description The attitude nearest to gimbal lock, where a warning tells of one. */
            worst?: components["schemas"]["WorstCase"];
            readings?: string[];
            crossCheck?: components["schemas"]["CrossCheck"];
            /** @description Name and version of the numerical core that answered. */
            engine: string;
        };
        CrossCheck: {
            /** @description Largest difference of a component from the exact one, in units of its last place. Half a unit is as near as a double can be. Differences below 1e-22, where components cancel, count as none. */
            maxUlp: number;
            /** @description Largest angle between the attitude answered and the exact one. */
            maxAngleRad: number;
            methods: {
                method: string;
                maxUlp?: number;
                maxAngleRad: number;
            }[];
        };
        /** @description An attitude to put the box in that tells remaining explanations apart. */
        DiscriminatingAttitude: {
            /** @description In the reference’s convention. */
            attitude: number[];
            reading: string;
            separates: {
                answers: number;
                explanations: number;
                /** @description What the box would list there, with the explanations, by their place, that say so. */
                predictions: {
                    numbers: number[];
                    explanations: number[];
                }[];
            };
        };
        EquivalentStatement: {
            convention: components["schemas"]["ConventionFacets"];
            /**
             * @description The numbers are those of half or of twice the rotation, or only the vector part of the quaternion.
             * @enum {string}
             */
            numbersAre?: "half-angle" | "double-angle" | "vector-part";
            constantOffset?: components["schemas"]["ConstantOffset"][];
        };
        /** @description Of the error angles; percentiles by nearest rank. */
        ErrorStatistics: {
            rms: number;
            median: number;
            p95: number;
            max: number;
            /** @enum {string} */
            unit: "deg" | "rad" | "arcsec";
        };
        Explanation: {
            convention: components["schemas"]["ConventionFacets"];
            /**
             * @description The numbers are those of half or of twice the rotation, or only the vector part of the quaternion.
             * @enum {string}
             */
            numbersAre?: "half-angle" | "double-angle" | "vector-part";
            constantOffset?: components["schemas"]["ConstantOffset"][];
            /** @description The numbers are those of the attitude so much earlier. */
            timeLag?: {
                seconds: number;
            };
            /** @description Every number is so many times what it should be. */
            scale?: number;
            /** @description What differs from the stated convention, one sentence each; empty where it is right as stated. */
            edits: string[];
            /** @description Of the angles that are left; √3 times the noise where the explanation is right. */
            residual: {
                rms: number;
                max: number;
                /** @enum {string} */
                unit: "deg" | "rad";
            };
            /** @description Other ways to state the same: equal numbers for every attitude. May be cut. */
            sameNumbersAs: components["schemas"]["EquivalentStatement"][];
        };
        HistoryEntry: {
            /** @description The request id, as in the X-Request-Id header of the answer. */
            id: string;
            /**
             * Format: date-time
             * @example 2026-05-04T08:30:00.000Z
             */
            at: string;
            key: {
                id: string;
                name: string;
                prefix: string;
            } | null;
            person: {
                id: string;
                name: string;
            } | null;
            /** @description Of the caller at the time of the call; null where nobody was known. */
            role: components["schemas"]["Role"] | null;
            method: string;
            route: string;
            status: number;
            /** @description The problem code of a refused call. */
            code: string | null;
            /** @description Of the run that the call made, if it made one. */
            verdict: ("pass" | "fail") | null;
            durationMs: number;
            attitudes: number;
            /** @description Attitudes that a warning was given for. */
            warnings: number;
            warningCodes: string[];
        };
        HistoryRecord: {
            /** @description The request id, as in the X-Request-Id header of the answer. */
            id: string;
            /**
             * Format: date-time
             * @example 2026-05-04T08:30:00.000Z
             */
            at: string;
            key: {
                id: string;
                name: string;
                prefix: string;
            } | null;
            person: {
                id: string;
                name: string;
            } | null;
            /** @description Of the caller at the time of the call; null where nobody was known. */
            role: components["schemas"]["Role"] | null;
            method: string;
            route: string;
            status: number;
            /** @description The problem code of a refused call. */
            code: string | null;
            /** @description Of the run that the call made, if it made one. */
            verdict: ("pass" | "fail") | null;
            durationMs: number;
            attitudes: number;
            /** @description Attitudes that a warning was given for. */
            warnings: number;
            warningCodes: string[];
            /** @description Of calls that compute; null for others. */
            body: {
                /** @description Of the body as it arrived, decompressed. */
                sha256: string;
                bytes: number;
                /** @description The body; null where the workspace keeps none, or it has more than 65536 bytes. */
                text: string | null;
            } | null;
        };
        HistorySettings: {
            /** @description Whether the bodies of calls that compute are kept, up to 65536 bytes each. Otherwise only their SHA-256 is. */
            keepBodies: boolean;
            /** @description Days after which calls are forgotten; null for never. Usage and runs stay. */
            retentionDays: number | null;
        };
        Identification: {
            /**
             * @description unique: one explanation, and no other fits the data within the noise. ambiguous: several do. none: nothing in the lattice does.
             * @enum {string}
             */
            outcome: "unique" | "ambiguous" | "none";
            /** @description Fewest edits first; at most 100. */
            explanations: components["schemas"]["Explanation"][];
            /** @description How many explanations remain in all. */
            remaining: number;
            /** @description What these data cannot tell. */
            unobservable: string[];
            discriminating: components["schemas"]["DiscriminatingAttitude"][];
            /** @description The nearest explanation that was given up, and how many times the noise it is off. */
            runnerUp: {
                convention: components["schemas"]["ConventionFacets"];
                /**
                 * @description The numbers are those of half or of twice the rotation, or only the vector part of the quaternion.
                 * @enum {string}
                 */
                numbersAre?: "half-angle" | "double-angle" | "vector-part";
                edits: string[];
                residual: {
                    rms: number;
                    /** @enum {string} */
                    unit: "deg" | "rad";
                };
                timesNoise: number;
            } | null;
        };
        IdentifyInput: {
            reference: {
                convention: components["schemas"]["Convention"];
                /** @description One array of numbers per attitude, in the count and order that the convention states. A row-major matrix may also stand as three rows of three. */
                attitudes: (number | number[])[][];
            };
            observed: components["schemas"]["ObservedAttitudes"] | components["schemas"]["ObservedRates"];
            /** @description Seconds, increasing, one for each attitude; needed to find a time lag, and to identify rates at all. */
            times?: number[];
            noise: components["schemas"]["Noise"];
        };
        /** @description A published interface version. */
        InterfaceReference: {
            interface: string;
            version: number;
        };
        IssueKeyInput: {
            name: string;
            role: components["schemas"]["Role"];
            /** @description When the key stops working by itself; null for never. */
            expiresAt: string | null;
        };
        /** @description Limits of one key; null for the role’s own. The tighter of the two is in force. */
        KeyLimits: {
            requestsPerMinute: number | null;
            attitudesPerMonth: number | null;
            attitudesPerCall: number | null;
            parallelRequests: number | null;
        };
        /** @description What one key, or one person signed in, may use. */
        Limits: {
            requestsPerMinute: number;
            attitudesPerMonth: number;
            /** @description Attitudes of one call with JSON on either side. What is streamed from rows to rows is bounded by the month alone. */
            attitudesPerCall: number;
            parallelRequests: number;
        };
        Noise: {
            /** @description Standard deviation of each component of the error rotation vector; 0 means exact. */
            angle: number;
            /** @enum {string} */
            unit: "deg" | "rad";
            /** @description Of observed rates: standard deviation of each component of the angular velocity; the angle is then the noise of the reference. */
            rate?: number;
            /** @enum {string} */
            rateUnit?: "deg/s" | "rad/s";
        };
        ObservedAttitudes: {
            /**
             * @description What the box is said to list. A claim: every reading of so many numbers is tried.
             * @enum {string}
             */
            representation: "euler" | "quaternion" | "dcm" | "rotation-vector" | "axis-angle" | "mrp" | "gibbs";
            /** @description One array of numbers per attitude, in the count and order that the convention states. A row-major matrix may also stand as three rows of three. */
            numbers: (number | number[])[][];
            /** @description The convention on the interface sheet; the edits say how the numbers differ from it. */
            stated?: components["schemas"]["Convention"];
        };
        ObservedRates: {
            /** @description One row of numbers per attitude, in the order and count that the convention states. */
            rates: number[][];
            /** @description What the box is said to list, and the convention of the attitude that goes with it. */
            stated: {
                attitude: components["schemas"]["Convention"];
                rate: components["schemas"]["Rate"];
            };
        };
        OwnUsage: {
            month: string;
            requests: number;
            attitudes: number;
            limits: components["schemas"]["Limits"];
            /**
             * Format: date-time
             * @description When the quota starts anew.
             * @example 2026-05-04T08:30:00.000Z
             */
            resetsAt: string;
            days: {
                day: string;
                requests: number;
                attitudes: number;
            }[];
        };
        Person: {
            id: string;
            name: string;
            email: string;
            role: components["schemas"]["Role"];
        };
        Preset: {
            id: string;
            title: string;
            description: string;
            convention: components["schemas"]["ConventionFacets"];
            /** @description The open standard that states this convention; null for one of ours. */
            standard: {
                name: string;
                clause: string;
                /**
                 * @description Whether the entry was compared with the text of the standard.
                 * @enum {string}
                 */
                checked: "confirmed" | "from memory";
                note?: string;
            } | null;
            /** @description One attitude in this convention: nose 030° true, 10° up, right wing 20° down. */
            worked: {
                reading: string;
                numbers: number[];
            };
            /** @description Published interface versions that state this convention. */
            interfaces: {
                interface: string;
                version: number;
            }[];
        };
        /** @description A preset by its id; see GET /conventions. */
        PresetReference: {
            /** @example aircraft-euler-deg */
            preset: string;
        };
        /** @description body, reference: angular velocity of the body axes relative to the reference axes, components in body or in reference axes. euler: derivatives of the angles, in their order and signs. quaternion, dcm: derivatives of the attitude’s own numbers. */
        Rate: {
            /** @constant */
            rate: "body";
            /** @enum {string} */
            unit: "deg/s" | "rad/s";
        } | {
            /** @constant */
            rate: "reference";
            /** @enum {string} */
            unit: "deg/s" | "rad/s";
        } | {
            /** @constant */
            rate: "euler";
            /** @enum {string} */
            unit: "deg/s" | "rad/s";
            /** @description The Euler convention whose angles are meant; required where the attitude is given in another representation. */
            angles?: components["schemas"]["Convention"];
        } | {
            /** @constant */
            rate: "quaternion";
        } | {
            /** @constant */
            rate: "dcm";
        };
        RateErrorStatistics: {
            rms: number;
            median: number;
            p95: number;
            max: number;
            /** @enum {string} */
            unit: "deg/s" | "rad/s";
        };
        RateExplanation: {
            attitude: components["schemas"]["ConventionFacets"];
            rate: {
                /** @enum {string} */
                rate: "body" | "reference" | "euler" | "quaternion" | "dcm";
                /** @enum {string} */
                unit?: "deg/s" | "rad/s";
                angles?: components["schemas"]["ConventionFacets"];
            };
            /** @description What differs from what was stated, one sentence each; empty where it is right. */
            edits: string[];
            /** @description Of the differences of the angular velocities. */
            residual: {
                rms: number;
                max: number;
                /** @enum {string} */
                unit: "deg/s" | "rad/s";
            };
            sameNumbersAs: {
                attitude: components["schemas"]["ConventionFacets"];
                rate: {
                    /** @enum {string} */
                    rate: "body" | "reference" | "euler" | "quaternion" | "dcm";
                    /** @enum {string} */
                    unit?: "deg/s" | "rad/s";
                    angles?: components["schemas"]["ConventionFacets"];
                };
            }[];
        };
        /** @description As Identification, of rates: a convention of the attitude and a form of rate stand in place of the convention. A test to make is an attitude to hold and a body axis to turn about, which its reading names. */
        RateIdentification: {
            /** @enum {string} */
            outcome: "unique" | "ambiguous" | "none";
            explanations: components["schemas"]["RateExplanation"][];
            remaining: number;
            unobservable: string[];
            discriminating: components["schemas"]["DiscriminatingAttitude"][];
        };
        RateRun: {
            /** @constant */
            kind: "rates";
            id: string;
            /**
             * Format: date-time
             * @example 2026-05-04T08:30:00.000Z
             */
            at: string;
            /** @enum {string} */
            verdict: "pass" | "fail";
            label: string | null;
            commit: string | null;
            key: {
                id: string;
                name: string;
            } | null;
            person: {
                id: string;
                name: string;
            } | null;
            count: number;
            failed: number;
            summary: string;
            engine: string;
            tolerance: components["schemas"]["RateTolerance"];
            worst: components["schemas"]["WorstRateError"];
            statistics: components["schemas"]["RateErrorStatistics"];
            attitude: components["schemas"]["ConventionFacets"];
            expected: {
                /** @enum {string} */
                rate: "body" | "reference" | "euler" | "quaternion" | "dcm";
                /** @enum {string} */
                unit?: "deg/s" | "rad/s";
                angles?: components["schemas"]["ConventionFacets"];
            };
            actual: {
                /** @enum {string} */
                rate: "body" | "reference" | "euler" | "quaternion" | "dcm";
                /** @enum {string} */
                unit?: "deg/s" | "rad/s";
                angles?: components["schemas"]["ConventionFacets"];
            };
            failures: {
                index: number;
                rate: number;
            }[];
        };
        RateTolerance: {
            rate: number;
            /** @enum {string} */
            unit: "deg/s" | "rad/s";
        };
        RatesInput: {
            attitude: components["schemas"]["Convention"];
            from: components["schemas"]["Rate"];
            to: components["schemas"]["Rate"];
            samples: {
                attitude: number[];
                rate: number[];
            }[];
        };
        RatesOutput: {
            /** @description null where an Euler rate does not exist, at gimbal lock; the middle one always does. */
            rates: (number | null)[][];
            /** @description κ of the Euler angles in play, by which a rate error can grow; 1 where there are none, null at lock. */
            conditions: (number | null)[];
            attitude: components["schemas"]["ConventionFacets"];
            from: {
                /** @enum {string} */
                rate: "body" | "reference" | "euler" | "quaternion" | "dcm";
                /** @enum {string} */
                unit?: "deg/s" | "rad/s";
                angles?: components["schemas"]["ConventionFacets"];
            };
            to: {
                /** @enum {string} */
                rate: "body" | "reference" | "euler" | "quaternion" | "dcm";
                /** @enum {string} */
                unit?: "deg/s" | "rad/s";
                angles?: components["schemas"]["ConventionFacets"];
            };
            warnings: components["schemas"]["Warning"][];
            engine: string;
        };
        ResolveInput: {
            attitude: components["schemas"]["Convention"];
            /**
             * @description The axes that the vectors are given in; they are resolved in the other ones.
             * @enum {string}
             */
            from: "reference" | "body";
            /** @description The form of the samples’ angular velocity; needed with derivatives. */
            rate?: components["schemas"]["Rate"];
            /** @description Either every sample has a derivative and a rate, or none. A derivative is how the vector changes as seen from the frame it is given in. */
            samples: {
                attitude: number[];
                vector: number[];
                derivative?: number[];
                rate?: number[];
            }[];
        };
        ResolveOutput: {
            vectors: [
                number,
                number,
                number
            ][];
            /** @description How each vector changes as seen from the frame it is resolved in. */
            derivatives?: [
                number,
                number,
                number
            ][];
            attitude: components["schemas"]["ConventionFacets"];
            /** @enum {string} */
            from: "reference" | "body";
            /** @enum {string} */
            to: "reference" | "body";
            rate?: {
                /** @enum {string} */
                rate: "body" | "reference" | "euler" | "quaternion" | "dcm";
                /** @enum {string} */
                unit?: "deg/s" | "rad/s";
                angles?: components["schemas"]["ConventionFacets"];
            };
            engine: string;
        };
        RigidBodyInput: {
            mass: number;
            /** @description Inertia matrix about the centre of mass in the same right-handed body axes, kg m²: moments on the diagonal, negative products beside it ([0][2] is −Ixz). */
            inertia: [
                [
                    number,
                    number,
                    number
                ],
                [
                    number,
                    number,
                    number
                ],
                [
                    number,
                    number,
                    number
                ]
            ];
            /** @description true: refuse the matrix unless Ixy = Iyz = 0. */
            symmetricAircraft?: boolean;
            states: {
                /** @description m/s, of the centre of mass relative to an inertial frame. */
                velocity: [
                    number,
                    number,
                    number
                ];
                /** @description rad/s. */
                angularVelocity: [
                    number,
                    number,
                    number
                ];
                /** @description m/s²: derivatives of the components as they stand. */
                velocityDerivative: [
                    number,
                    number,
                    number
                ];
                /** @description rad/s². */
                angularVelocityDerivative: [
                    number,
                    number,
                    number
                ];
                /** @description N, to be compared with what the motion takes. */
                force?: [
                    number,
                    number,
                    number
                ];
                /** @description N m about the centre of mass, to be compared. */
                moment?: [
                    number,
                    number,
                    number
                ];
            }[];
        };
        RigidBodyOutput: {
            /** @description N: m (v̇ + ω × v), the sum of all external forces, weight among them. */
            forces: [
                number,
                number,
                number
            ][];
            /** @description N m: I ω̇ + ω × I ω. */
            moments: [
                number,
                number,
                number
            ][];
            /** @description Given less computed, where a state gives a force or a moment. */
            residuals?: {
                force: [
                    number,
                    number,
                    number
                ] | null;
                moment: [
                    number,
                    number,
                    number
                ] | null;
            }[];
            inertia: {
                /** @description kg m², least first. */
                principalMoments: [
                    number,
                    number,
                    number
                ];
                symmetricAircraft: boolean;
                statement: string;
            };
            engine: string;
        };
        /** @enum {string} */
        Role: "administrator" | "integrator" | "engineer" | "reviewer";
        RoleLimits: {
            role: components["schemas"]["Role"];
            requestsPerMinute: number;
            attitudesPerMonth: number;
            /** @description Attitudes of one call with JSON on either side. What is streamed from rows to rows is bounded by the month alone. */
            attitudesPerCall: number;
            parallelRequests: number;
        };
        Run: components["schemas"]["AttitudeRun"] | components["schemas"]["RateRun"];
        SignInInput: {
            email: string;
            password: string;
        };
        SignedIn: {
            person: components["schemas"]["Person"];
        };
        Tolerance: {
            angle: number;
            /** @enum {string} */
            unit: "deg" | "rad" | "arcsec";
        };
        UsageByKey: {
            month: string;
            keys: {
                id: string;
                name: string;
                prefix: string;
                role: components["schemas"]["Role"];
                requests: number;
                attitudes: number;
                attitudesPerMonth: number;
            }[];
            roles: {
                role: components["schemas"]["Role"];
                requests: number;
                attitudes: number;
            }[];
        };
        VerifyInput: {
            expected: {
                convention: components["schemas"]["Convention"];
                /** @description One array of numbers per attitude, in the count and order that the convention states. A row-major matrix may also stand as three rows of three. */
                attitudes: (number | number[])[][];
            };
            actual: {
                convention: components["schemas"]["Convention"];
                /** @description One array of numbers per attitude, in the count and order that the convention states. A row-major matrix may also stand as three rows of three. */
                attitudes: (number | number[])[][];
            };
            tolerance: components["schemas"]["Tolerance"];
            /**
             * @description What to do with numbers that are no rotation by more than 1e-6, such as quaternions of four digits: refuse them (none, the policy when absent) or take the nearest rotation and warn.
             * @enum {string}
             */
            repair?: "none" | "nearest";
            /** @description Where the verdict is fail, also say which mistakes would explain the actual attitudes. The noise is taken as a fifth of the tolerance. */
            diagnose?: boolean;
            /** @description Seconds, increasing, one for each attitude; with them a diagnosis can find a time lag. */
            times?: number[];
            /** @description What was checked; runs can be found by it. */
            label?: string;
            /** @description The commit of the code that computed the actual attitudes. */
            commit?: string;
        };
        VerifyOutput: {
            /** @enum {string} */
            verdict: "pass" | "fail";
            /** @description Id of the stored run. */
            run: string;
            count: number;
            failed: number;
            worst: components["schemas"]["WorstError"];
            statistics: components["schemas"]["ErrorStatistics"];
            /** @description The first 100 attitudes off by more than the tolerance, with the angle in its unit. */
            failures: {
                index: number;
                angle: number;
            }[];
            /** @description The worst error in a plain sentence. */
            summary: string;
            engine: string;
            /** @description What was repaired. */
            warnings?: components["schemas"]["Warning"][];
            diagnosis?: components["schemas"]["Identification"];
        };
        VerifyRatesInput: {
            /** @description The attitudes at which the rates stand, one for each. */
            attitude: {
                convention: components["schemas"]["Convention"];
                /** @description One array of numbers per attitude, in the count and order that the convention states. A row-major matrix may also stand as three rows of three. */
                attitudes: (number | number[])[][];
            };
            expected: {
                rate: components["schemas"]["Rate"];
                /** @description One row of numbers per attitude, in the order and count that the convention states. */
                rates: number[][];
            };
            actual: {
                rate: components["schemas"]["Rate"];
                /** @description One row of numbers per attitude, in the order and count that the convention states. */
                rates: number[][];
            };
            tolerance: components["schemas"]["RateTolerance"];
            label?: string;
            commit?: string;
        };
        VerifyRatesOutput: {
            /** @enum {string} */
            verdict: "pass" | "fail";
            run: string;
            count: number;
            failed: number;
            worst: components["schemas"]["WorstRateError"];
            statistics: components["schemas"]["RateErrorStatistics"];
            failures: {
                index: number;
                rate: number;
            }[];
            summary: string;
            engine: string;
        };
        Warning: {
            /** @enum {string} */
            code: "near-gimbal-lock" | "severe-gimbal-lock" | "gimbal-lock" | "renormalised" | "reorthonormalised";
            message: string;
            count: number;
            /** @description The first 100. */
            indices: number[];
            worst: components["schemas"]["WorstCase"];
        };
        WorstCase: {
            index: number;
            /** @description κ = 1/|cos(middle angle)| (1/|sin| where the first and third axes are the same): an attitude error δ shows up as at most κ·δ in the first and last angle. null at exact lock. */
            condition?: number | null;
            /** @description log10 κ; null at exact lock. */
            digitsLost?: number | null;
            /** @description Angle left to gimbal lock, in degrees. */
            marginDeg?: number;
            /** @description The combination of first and last applied angle that stays well conditioned near lock. */
            wellConditioned?: {
                /** @enum {string} */
                combination: "first-minus-last" | "first-plus-last";
                angle: number;
                /** @enum {string} */
                unit: "deg" | "rad";
            };
            /** @description Norm defect of a quaternion or orthogonality defect of a matrix that was repaired. */
            defect?: number;
        };
        WorstError: {
            index: number;
            angle: number;
            /** @enum {string} */
            unit: "deg" | "rad" | "arcsec";
            /** @description Unit axis in forward, right, down: the rotation by the angle about it carries the expected attitude into the actual one. */
            axisBody: [
                number,
                number,
                number
            ];
        };
        WorstRateError: {
            index: number;
            rate: number;
            /** @enum {string} */
            unit: "deg/s" | "rad/s";
            /** @description Unit direction in forward, right, down of the actual angular velocity less the expected one. */
            axisBody: [
                number,
                number,
                number
            ];
        };
        /** @description What was wrong (RFC 9457). `code` is stable; branch on it. */
        Problem: {
            /** @example /problems/missing-facet */
            type: string;
            title: string;
            status: number;
            detail: string;
            /** @description Names the call by its request id. */
            instance: string;
            /** @enum {string} */
            code: "malformed-json" | "malformed-request" | "invalid-cursor" | "missing-key" | "invalid-key" | "revoked-key" | "expired-key" | "not-signed-in" | "wrong-credentials" | "not-allowed" | "cross-site" | "unknown-route" | "not-found" | "unknown-preset" | "unknown-interface" | "method-not-allowed" | "not-acceptable" | "conflict" | "already-revoked" | "body-too-large" | "batch-too-large" | "unsupported-media-type" | "unsupported-encoding" | "missing-facet" | "unknown-facet" | "invalid-facet" | "missing-field" | "unknown-field" | "invalid-field" | "count-mismatch" | "not-a-number" | "not-finite" | "out-of-range" | "zero-norm" | "not-a-rotation" | "improper-axes" | "unrelated-frames" | "not-representable" | "invalid-convention" | "impossible-inertia" | "too-many-requests" | "too-many-parallel" | "quota-exceeded" | "internal" | "cross-check-failed" | "not-recorded";
            errors: {
                /** @description JSON pointer into the body, or ?name for a query parameter. */
                pointer: string;
                message: string;
            }[];
        };
    };
    responses: never;
    parameters: never;
    requestBodies: never;
    headers: never;
    pathItems: never;
}
export type $defs = Record<string, never>;
export interface operations {
    convertAttitudes: {
        parameters: {
            query?: {
                /** @description Convention of the body, where the body is only rows: the id of a preset, or a convention as JSON. JSON bodies state it themselves. */
                from?: string;
                /** @description Convention of the answer, where the body is only rows: the id of a preset, or a convention as JSON. JSON bodies state it themselves. */
                to?: string;
                /** @description As options.repair of a JSON body. */
                repair?: "none" | "nearest";
                /** @description As options.warnWithinDeg of a JSON body. */
                warnWithinDeg?: string;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "from": {
                 *         "preset": "aircraft-euler-deg"
                 *       },
                 *       "to": {
                 *         "preset": "aircraft-quaternion"
                 *       },
                 *       "attitudes": [
                 *         [
                 *           30,
                 *           10,
                 *           20
                 *         ]
                 *       ],
                 *       "options": {
                 *         "readings": true
                 *       }
                 *     }
                 */
                "application/json": components["schemas"]["ConvertInput"];
                "application/x-ndjson": unknown;
                "text/csv": unknown;
                "application/octet-stream": unknown;
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ConvertOutput"];
                    "application/x-ndjson": unknown;
                    "text/csv": unknown;
                    "application/octet-stream": unknown;
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Not Acceptable. Codes: not-acceptable. */
            406: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    convertRates: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "attitude": {
                 *         "preset": "aircraft-euler-deg"
                 *       },
                 *       "from": {
                 *         "rate": "euler",
                 *         "unit": "deg/s"
                 *       },
                 *       "to": {
                 *         "rate": "body",
                 *         "unit": "deg/s"
                 *       },
                 *       "samples": [
                 *         {
                 *           "attitude": [
                 *             200,
                 *             0,
                 *             30
                 *           ],
                 *           "rate": [
                 *             4.6,
                 *             0,
                 *             0
                 *           ]
                 *         }
                 *       ]
                 *     }
                 */
                "application/json": components["schemas"]["RatesInput"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["RatesOutput"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    verifyAttitudes: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "expected": {
                 *         "convention": {
                 *           "preset": "aircraft-euler-deg"
                 *         },
                 *         "attitudes": [
                 *           [
                 *             30,
                 *             10,
                 *             20
                 *           ]
                 *         ]
                 *       },
                 *       "actual": {
                 *         "convention": {
                 *           "preset": "aircraft-quaternion"
                 *         },
                 *         "attitudes": [
                 *           [
                 *             0.9515,
                 *             0.1449,
                 *             0.1277,
                 *             0.2393
                 *           ]
                 *         ]
                 *       },
                 *       "tolerance": {
                 *         "angle": 0.05,
                 *         "unit": "deg"
                 *       },
                 *       "repair": "nearest",
                 *       "label": "Autopilot attitude",
                 *       "commit": "4f9d2c1"
                 *     }
                 */
                "application/json": components["schemas"]["VerifyInput"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["VerifyOutput"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    verifyRates: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "attitude": {
                 *         "convention": {
                 *           "preset": "aircraft-euler-deg"
                 *         },
                 *         "attitudes": [
                 *           [
                 *             0,
                 *             0,
                 *             35
                 *           ]
                 *         ]
                 *       },
                 *       "expected": {
                 *         "rate": {
                 *           "rate": "euler",
                 *           "unit": "deg/s"
                 *         },
                 *         "rates": [
                 *           [
                 *             9,
                 *             0,
                 *             0
                 *           ]
                 *         ]
                 *       },
                 *       "actual": {
                 *         "rate": {
                 *           "rate": "body",
                 *           "unit": "deg/s"
                 *         },
                 *         "rates": [
                 *           [
                 *             0,
                 *             5.162,
                 *             7.372
                 *           ]
                 *         ]
                 *       },
                 *       "tolerance": {
                 *         "rate": 0.01,
                 *         "unit": "deg/s"
                 *       },
                 *       "label": "Rate gyros"
                 *     }
                 */
                "application/json": components["schemas"]["VerifyRatesInput"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["VerifyRatesOutput"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    identifyConvention: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "reference": {
                 *         "convention": {
                 *           "preset": "aircraft-euler-deg"
                 *         },
                 *         "attitudes": [
                 *           [
                 *             30,
                 *             10,
                 *             20
                 *           ],
                 *           [
                 *             120,
                 *             -20,
                 *             40
                 *           ],
                 *           [
                 *             250,
                 *             30,
                 *             -25
                 *           ],
                 *           [
                 *             340,
                 *             5,
                 *             60
                 *           ]
                 *         ]
                 *       },
                 *       "observed": {
                 *         "representation": "quaternion",
                 *         "numbers": [
                 *           [
                 *             0.1449,
                 *             0.1277,
                 *             0.2393,
                 *             0.9515
                 *           ],
                 *           [
                 *             0.3097,
                 *             0.2101,
                 *             0.8311,
                 *             0.4113
                 *           ],
                 *           [
                 *             0.0871,
                 *             0.3162,
                 *             -0.7404,
                 *             0.5868
                 *           ],
                 *           [
                 *             0.4985,
                 *             -0.0495,
                 *             -0.1717,
                 *             0.8483
                 *           ]
                 *         ],
                 *         "stated": {
                 *           "preset": "aircraft-quaternion"
                 *         }
                 *       },
                 *       "noise": {
                 *         "angle": 0.01,
                 *         "unit": "deg"
                 *       }
                 *     }
                 */
                "application/json": components["schemas"]["IdentifyInput"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Identification"] | components["schemas"]["RateIdentification"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    resolveVectors: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "attitude": {
                 *         "preset": "aircraft-euler-deg"
                 *       },
                 *       "from": "body",
                 *       "rate": {
                 *         "rate": "body",
                 *         "unit": "deg/s"
                 *       },
                 *       "samples": [
                 *         {
                 *           "attitude": [
                 *             0,
                 *             0,
                 *             0
                 *           ],
                 *           "vector": [
                 *             10,
                 *             0,
                 *             0
                 *           ],
                 *           "derivative": [
                 *             1,
                 *             0,
                 *             0
                 *           ],
                 *           "rate": [
                 *             0,
                 *             0,
                 *             90
                 *           ]
                 *         }
                 *       ]
                 *     }
                 */
                "application/json": components["schemas"]["ResolveInput"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ResolveOutput"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    computeRigidBody: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "mass": 9300,
                 *       "inertia": [
                 *         [
                 *           12875,
                 *           0,
                 *           -1331
                 *         ],
                 *         [
                 *           0,
                 *           75674,
                 *           0
                 *         ],
                 *         [
                 *           -1331,
                 *           0,
                 *           85552
                 *         ]
                 *       ],
                 *       "states": [
                 *         {
                 *           "velocity": [
                 *             120,
                 *             3,
                 *             9
                 *           ],
                 *           "angularVelocity": [
                 *             0.31,
                 *             -0.12,
                 *             0.07
                 *           ],
                 *           "velocityDerivative": [
                 *             0.4,
                 *             -0.2,
                 *             1.1
                 *           ],
                 *           "angularVelocityDerivative": [
                 *             0.4,
                 *             -0.05,
                 *             0.02
                 *           ]
                 *         }
                 *       ]
                 *     }
                 */
                "application/json": components["schemas"]["RigidBodyInput"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["RigidBodyOutput"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    listRuns: {
        parameters: {
            query?: {
                /** @description As given by the page before. */
                cursor?: string;
                /** @description Rows a page, 1 to 200; 50 when absent. */
                limit?: string;
                verdict?: "pass" | "fail";
                label?: string;
                key?: string;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        items: components["schemas"]["Run"][];
                        nextCursor: string | null;
                    };
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    getRunAsJUnit: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                id: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/xml": string;
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Not Found. Codes: unknown-route, not-found. */
            404: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    getRun: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                id: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Run"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Not Found. Codes: unknown-route, not-found. */
            404: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    listConventions: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        items: components["schemas"]["Preset"][];
                    };
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    getConvention: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                id: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Preset"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Not Found. Codes: unknown-route, not-found. */
            404: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    listKeys: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        items: components["schemas"]["ApiKey"][];
                    };
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    issueKey: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "name": "Attitude pipeline",
                 *       "role": "engineer",
                 *       "expiresAt": null
                 *     }
                 */
                "application/json": components["schemas"]["IssueKeyInput"];
            };
        };
        responses: {
            /** @description Created */
            201: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        key: components["schemas"]["ApiKey"];
                        secret: string;
                    };
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    revokeKey: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                id: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        key: components["schemas"]["ApiKey"];
                    };
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Not Found. Codes: unknown-route, not-found. */
            404: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Conflict. Codes: conflict, already-revoked. */
            409: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    changeKeyLimits: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                id: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["KeyLimits"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["KeyLimits"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Not Found. Codes: unknown-route, not-found. */
            404: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    listHistory: {
        parameters: {
            query?: {
                /** @description As given by the page before. */
                cursor?: string;
                /** @description Rows a page, 1 to 200; 50 when absent. */
                limit?: string;
                /** @description API key id. */
                key?: string;
                /** @description Role of the caller at the time of the call. */
                role?: components["schemas"]["Role"];
                /** @description As in the entries, such as /api/v1/convert. */
                route?: string;
                status?: string;
                verdict?: "pass" | "fail";
                /** @description Calls with a warning of this code. */
                warning?: "near-gimbal-lock" | "severe-gimbal-lock" | "gimbal-lock" | "renormalised" | "reorthonormalised";
                /** @description A request id, or how it begins. */
                id?: string;
                /** @description Not before this time. */
                from?: string;
                /** @description Before this time. */
                to?: string;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        items: components["schemas"]["HistoryEntry"][];
                        /** @description Give it as `cursor` for the next page; null on the last. */
                        nextCursor: string | null;
                        /** @description Where a page is shorter than asked for and not the last: how far back it has looked. */
                        searchedBackTo: string | null;
                        /** @description Routes that the caller’s history holds, for filtering. */
                        routes: string[];
                    };
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    exportHistory: {
        parameters: {
            query?: {
                /** @description API key id. */
                key?: string;
                /** @description Role of the caller at the time of the call. */
                role?: components["schemas"]["Role"];
                /** @description As in the entries, such as /api/v1/convert. */
                route?: string;
                status?: string;
                verdict?: "pass" | "fail";
                /** @description Calls with a warning of this code. */
                warning?: "near-gimbal-lock" | "severe-gimbal-lock" | "gimbal-lock" | "renormalised" | "reorthonormalised";
                /** @description A request id, or how it begins. */
                id?: string;
                /** @description Not before this time. */
                from?: string;
                /** @description Before this time. */
                to?: string;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "text/csv": string;
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    getHistorySettings: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["HistorySettings"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    changeHistorySettings: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                /**
                 * @example {
                 *       "keepBodies": true,
                 *       "retentionDays": 365
                 *     }
                 */
                "application/json": components["schemas"]["HistorySettings"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["HistorySettings"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    getHistoryEntry: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                id: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["HistoryRecord"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Not Found. Codes: unknown-route, not-found. */
            404: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    ownUsage: {
        parameters: {
            query?: {
                /** @description As 2026-03, by UTC; this month when absent. */
                month?: string;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["OwnUsage"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    usageByKey: {
        parameters: {
            query?: {
                /** @description As 2026-03, by UTC; this month when absent. */
                month?: string;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["UsageByKey"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    listLimits: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        items: components["schemas"]["RoleLimits"][];
                    };
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    changeLimits: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                role: components["schemas"]["Role"];
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["Limits"];
            };
        };
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["RoleLimits"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    signIn: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["SignInInput"];
            };
        };
        responses: {
            /** @description Created */
            201: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SignedIn"];
                };
            };
            /** @description Bad Request. Codes: malformed-json, malformed-request, invalid-cursor. */
            400: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Payload Too Large. Codes: body-too-large, batch-too-large. */
            413: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unsupported Media Type. Codes: unsupported-media-type, unsupported-encoding. */
            415: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Unprocessable Entity. Codes: unknown-preset, unknown-interface, missing-facet, unknown-facet, invalid-facet, missing-field, unknown-field, invalid-field, count-mismatch, not-a-number, not-finite, out-of-range, zero-norm, not-a-rotation, improper-axes, unrelated-frames, not-representable, invalid-convention, impossible-inertia. */
            422: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    currentSession: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        person: components["schemas"]["Person"] | null;
                    };
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    signOut: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description No Content */
            204: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Unauthorized. Codes: missing-key, invalid-key, revoked-key, expired-key, not-signed-in, wrong-credentials. */
            401: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Forbidden. Codes: not-allowed, cross-site. */
            403: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Too Many Requests. Codes: too-many-requests, too-many-parallel, quota-exceeded. */
            429: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    health: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description OK */
            200: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        status: "ok";
                        engine: string;
                    };
                };
            };
            /** @description Internal Server Error. Codes: internal, cross-check-failed. */
            500: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description Service Unavailable. Codes: not-recorded. */
            503: {
                headers: {
                    /** @description The id of this call in the history. */
                    "X-Request-Id"?: string;
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
}
