/** Generated from the contracts by `npm run generate`; not written by hand. */
export interface paths {
    readonly "/api/v1/readings": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a position, cacheable
         * @description The same reading at an address of its own, with a strong ETag: it changes only when the engine does.
         */
        readonly get: operations["getReading"];
        readonly put?: never;
        /**
         * Read a position
         * @description Computes the reading of one position: every square, every man, pawns, weak squares, outposts, files, kings, and what follows from them in sentences.
         */
        readonly post: operations["createReading"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/readings/batch": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Read many positions
         * @description Reads up to 1000 positions and answers one JSON value a line, in the order of the request, each as soon as it is computed. A FEN that cannot be read is answered in its place.
         */
        readonly post: operations["createReadings"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/routes": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Find posts and routes
         * @description Ranks the posts of one man, or of all men of a side, with the counts that rank them, the safe ways there, what must be prepared first, who can dispute the post, and what a small exact search says. An aid to judgement: the weights are in the answer.
         */
        readonly post: operations["createRoutes"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/routes/check": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Check a route
         * @description A verdict for each step of a route that a person gives, with its reason, the enemy standing still.
         */
        readonly post: operations["createRouteCheck"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/comparisons": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Compare positions or placements
         * @description Holds one to three positions against a first: what differs by square, man and theme, what is said of one only, and the difference in sentences. A placement is a position with one man put elsewhere.
         */
        readonly post: operations["createComparison"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/exchanges": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Test the trades
         * @description For every pair of men of like worth: what changes when both leave the board, and when it could be offered.
         */
        readonly post: operations["createExchanges"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/games": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Read games
         * @description PGN to a compact reading of every position, the journey of every man, the moves that changed something for good, and the origin of every lasting feature. Up to 20 games; a bad game is named in "faults" with its line and move, and the good ones are answered.
         */
        readonly post: operations["createGames"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/structures": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the structure sheets
         * @description Handbook knowledge about every named pawn structure: key squares, usual posts, levers, trades and plans of both sides.
         */
        readonly get: operations["listStructures"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/structures/{id}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a structure sheet
         * @description The sheet of one structure, in the colours as the books draw it.
         */
        readonly get: operations["getStructure"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/sheets": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Hold a structure sheet against a position
         * @description Names the position’s structure and says of each key square, post, lever and trade of its sheet whether it is to be had. The sheet is null where the pawns have no name.
         */
        readonly get: operations["getSheet"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/plates.svg": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Draw a plate as SVG
         * @description Draws the position with one layer of its reading and, if asked, the leading statements beside the board. The same marks draw the page.
         */
        readonly get: operations["getPlateSvg"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/plates.png": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Draw a plate as PNG
         * @description Draws the position with one layer of its reading and, if asked, the leading statements beside the board. The same marks draw the page. The PNG is at most 2400 pixels wide.
         */
        readonly get: operations["getPlatePng"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List studies
         * @description The studies that the caller may read, the last changed first.
         */
        readonly get: operations["listStudies"];
        readonly put?: never;
        /**
         * Make a study
         * @description Makes an empty study in the workspace.
         */
        readonly post: operations["createStudy"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a study
         * @description A study with its version, which the ETag names. Its positions are a list of their own.
         */
        readonly get: operations["getStudy"];
        readonly put?: never;
        readonly post?: never;
        /**
         * Put a study into the trash
         * @description Puts a study into the trash with all that is in it; it can be restored for thirty days.
         */
        readonly delete: operations["deleteStudy"];
        readonly options?: never;
        readonly head?: never;
        /**
         * Change a study
         * @description Changes title or summary.
         */
        readonly patch: operations["changeStudy"];
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/restore": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Take a study out of the trash
         * @description The study is as it was. One that is not in the trash stays as it is.
         */
        readonly post: operations["restoreStudy"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/history": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read the history of a study
         * @description Every change with who, when, before and after, the newest first.
         */
        readonly get: operations["listChanges"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/shares": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * See with whom a study is shared
         * @description The students who may read it; owners, coaches and writers of the workspace may always.
         */
        readonly get: operations["getShares"];
        /**
         * Share a study
         * @description Shares a study with these students and with no others.
         */
        readonly put: operations["putShares"];
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/export.pgn": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Export a study as PGN
         * @description Each position is a game without moves that begins there, its note a comment; then the games of the study.
         */
        readonly get: operations["exportStudyPgn"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/export.csv": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Export the positions of a study as CSV
         * @description One line a position: place, title, FEN, layer, man, note (RFC 4180).
         */
        readonly get: operations["exportStudyCsv"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/export.json": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Export a study as JSON
         * @description Everything in a study, as the other calls answer it.
         */
        readonly get: operations["exportStudyJson"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/positions": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the positions of a study
         * @description All positions of a study in their order.
         */
        readonly get: operations["listPositions"];
        readonly put?: never;
        /**
         * Keep a position in a study
         * @description Keeps a position with its title, note, marks and chosen layer. Diagrams without kings are taken too.
         */
        readonly post: operations["createPosition"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/positions/{positionId}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a position of a study
         * @description A position with its version, which the ETag names.
         */
        readonly get: operations["getPosition"];
        readonly put?: never;
        readonly post?: never;
        /**
         * Put a position into the trash
         * @description It can be restored for thirty days.
         */
        readonly delete: operations["deletePosition"];
        readonly options?: never;
        readonly head?: never;
        /**
         * Change a position of a study
         * @description Changes the fields that are given: board, words, marks, layer, place.
         */
        readonly patch: operations["changePosition"];
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/positions/{positionId}/restore": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Restore a position
         * @description Takes a position out of the trash, or back to what it was at a version of its history.
         */
        readonly post: operations["restorePosition"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/routes": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the routes of a study
         * @description All routes kept in a study, the oldest first.
         */
        readonly get: operations["listStudyRoutes"];
        readonly put?: never;
        /**
         * Compute a route and keep it
         * @description Computes the request now, and keeps it with its result and the version of the engine.
         */
        readonly post: operations["createStudyRoute"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/routes/{resultId}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a route of a study
         * @description What was asked, what came out, and which engine said so.
         */
        readonly get: operations["getStudyRoute"];
        readonly put?: never;
        readonly post?: never;
        /**
         * Put a route into the trash
         * @description It can be restored for thirty days.
         */
        readonly delete: operations["deleteStudyRoute"];
        readonly options?: never;
        readonly head?: never;
        /**
         * Change the words of a route
         * @description Changes title or note; request and result stay.
         */
        readonly patch: operations["changeStudyRoute"];
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/routes/{resultId}/restore": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Take a route out of the trash
         * @description It is as it was.
         */
        readonly post: operations["restoreStudyRoute"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/comparisons": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the comparisons of a study
         * @description All comparisons kept in a study, the oldest first.
         */
        readonly get: operations["listStudyComparisons"];
        readonly put?: never;
        /**
         * Compute a comparison and keep it
         * @description Computes the request now, and keeps it with its result and the version of the engine.
         */
        readonly post: operations["createStudyComparison"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/comparisons/{resultId}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a comparison of a study
         * @description What was asked, what came out, and which engine said so.
         */
        readonly get: operations["getStudyComparison"];
        readonly put?: never;
        readonly post?: never;
        /**
         * Put a comparison into the trash
         * @description It can be restored for thirty days.
         */
        readonly delete: operations["deleteStudyComparison"];
        readonly options?: never;
        readonly head?: never;
        /**
         * Change the words of a comparison
         * @description Changes title or note; request and result stay.
         */
        readonly patch: operations["changeStudyComparison"];
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/comparisons/{resultId}/restore": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Take a comparison out of the trash
         * @description It is as it was.
         */
        readonly post: operations["restoreStudyComparison"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/exchanges": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the exchange tests of a study
         * @description All exchange tests kept in a study, the oldest first.
         */
        readonly get: operations["listStudyExchanges"];
        readonly put?: never;
        /**
         * Compute a exchange test and keep it
         * @description Computes the request now, and keeps it with its result and the version of the engine.
         */
        readonly post: operations["createStudyExchange"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/exchanges/{resultId}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read a exchange test of a study
         * @description What was asked, what came out, and which engine said so.
         */
        readonly get: operations["getStudyExchange"];
        readonly put?: never;
        readonly post?: never;
        /**
         * Put a exchange test into the trash
         * @description It can be restored for thirty days.
         */
        readonly delete: operations["deleteStudyExchange"];
        readonly options?: never;
        readonly head?: never;
        /**
         * Change the words of a exchange test
         * @description Changes title or note; request and result stay.
         */
        readonly patch: operations["changeStudyExchange"];
        readonly trace?: never;
    };
    readonly "/api/v1/studies/{id}/exchanges/{resultId}/restore": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Take a exchange test out of the trash
         * @description It is as it was.
         */
        readonly post: operations["restoreStudyExchange"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/jobs": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List jobs
         * @description The jobs of the workspace, the newest first.
         */
        readonly get: operations["listJobs"];
        readonly put?: never;
        /**
         * Begin long work
         * @description Up to ten thousand positions to be read, a list of FENs or a PGN to be imported into a study, or a study to be computed anew by the present engine. It goes on when the caller goes away, and after a crash.
         */
        readonly post: operations["createJob"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/jobs/{id}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * See how far a job is
         * @description Counts of items done and refused.
         */
        readonly get: operations["getJob"];
        readonly put?: never;
        readonly post?: never;
        /**
         * Cancel a job
         * @description Ends a job; what is done stays done. One that has ended stays as it is.
         */
        readonly delete: operations["cancelJob"];
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/jobs/{id}/events": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Watch a job
         * @description Server-sent events: the job at once, at each change, and when it has ended; then the stream ends.
         */
        readonly get: operations["watchJob"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/jobs/{id}/items": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Read what became of the items
         * @description Each item in the order of the request: what was made of it, or why it was refused.
         */
        readonly get: operations["listJobItems"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/jobs/{id}/retry": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        /**
         * Try a job again
         * @description Puts a job that failed, was cancelled, or has refused items back into the queue. Done items stay done.
         */
        readonly post: operations["retryJob"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/keys": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the keys
         * @description All keys of the workspace, the newest first, those that are ended or expired too.
         */
        readonly get: operations["listKeys"];
        readonly put?: never;
        /**
         * Make a key
         * @description Makes a key with some scopes and an end. Its secret is in this answer and nowhere else.
         */
        readonly post: operations["createKey"];
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/keys/{id}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly get?: never;
        readonly put?: never;
        readonly post?: never;
        /**
         * End a key
         * @description Ends a key at once and for good. A key that is ended already stays so.
         */
        readonly delete: operations["revokeKey"];
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/usage": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * See what the keys have used
         * @description Counts of calls by key, day and call.
         */
        readonly get: operations["getUsage"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * List the calls
         * @description A small index: every call with its address, and where the document is.
         */
        readonly get: operations["getIndex"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/openapi.json": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * The OpenAPI document
         * @description This document, generated from the schemas that check requests and replies.
         */
        readonly get: operations["getDocument"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/v1/problems/{code}": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Explain a problem
         * @description The "type" of every problem is an address of this call.
         */
        readonly get: operations["getProblem"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
    readonly "/api/health": {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /**
         * Live and ready
         * @description Answers as long as the service lives; "ready" says that it takes work.
         */
        readonly get: operations["getHealth"];
        readonly put?: never;
        readonly post?: never;
        readonly delete?: never;
        readonly options?: never;
        readonly head?: never;
        readonly patch?: never;
        readonly trace?: never;
    };
}
export type webhooks = Record<string, never>;
export interface components {
    schemas: {
        /** @description Stands in the place of a reading that could not be made. */
        readonly BadLine: {
            readonly error: components["schemas"]["Fault"];
            /** @description The number of the FEN, from 1. */
            readonly line: number;
        };
        /** @description One count a theme, before and after. */
        readonly BalanceLine: {
            /** @enum {string} */
            readonly theme: "structure" | "squares" | "outposts" | "files" | "men" | "king" | "control";
            /** @description What is counted, in words. */
            readonly counts: string;
            readonly white: {
                /** @description Before. */
                readonly a: number;
                /** @description After. */
                readonly b: number;
            };
            readonly black: {
                /** @description Before. */
                readonly a: number;
                /** @description After. */
                readonly b: number;
            };
        };
        /** @description Positions to read. */
        readonly BatchRequest: {
            /** @description FENs, answered in this order, one a line. */
            readonly fens: readonly string[];
            /** @default strict */
            readonly mode?: components["schemas"]["Mode"];
            /** @description Only these parts, beside the position itself. Left out: the whole reading. */
            readonly include?: readonly components["schemas"]["ReadingPart"][];
        };
        /** @description A bound that was passed: its name and the most that is taken. */
        readonly Bound: {
            readonly name: string;
            readonly max: number;
        };
        /** @description What was changed in a study, by whom and when. */
        readonly Change: {
            readonly id: components["schemas"]["Id"];
            /** @enum {string} */
            readonly entity: "study" | "position" | "result" | "game";
            readonly entityId: components["schemas"]["Id"];
            /** @description One more with each change; the ETag names it. */
            readonly version: number;
            /** @enum {string} */
            readonly kind: "create" | "update" | "delete" | "restore";
            readonly at: components["schemas"]["Moment"];
            /** @description The name of the person or key; null: gone. */
            readonly by: string | null;
            readonly before: {
                readonly [key: string]: unknown;
            } | null;
            readonly after: {
                readonly [key: string]: unknown;
            } | null;
        };
        /** @description A page of a list. */
        readonly ChangePage: {
            readonly items: readonly components["schemas"]["Change"][];
            /** @description The cursor of the next page; null at the end. */
            readonly next: string | null;
        };
        /** @description The verdict of one step of a given route. */
        readonly CheckedStep: {
            readonly to: components["schemas"]["Square"];
            /**
             * @description fine; not-a-move; own-man or captures: the square is taken; exposes-king; gives-check before the last step; unsafe: lost by exchange; loses: the guard sees something lost.
             * @enum {string}
             */
            readonly code: "fine" | "not-a-move" | "own-man" | "captures" | "exposes-king" | "gives-check" | "unsafe" | "loses";
            /** @description Pawns lost by exchange on the square. */
            readonly loses: number;
            /** @description Null where the step is no move. */
            readonly step: components["schemas"]["RouteStep"] | null;
            readonly guard: components["schemas"]["RouteGuard"] | null;
            /** @description The verdict in a sentence. */
            readonly reason: string;
        };
        /**
         * @description A colour of squares.
         * @enum {string}
         */
        readonly Colour: "light" | "dark";
        /** @description A move that cannot be taken back, and what it changed for good. */
        readonly Commitment: {
            /** @description Half-moves played. */
            readonly ply: number;
            /** @description With its number, as "12. Nf3" or "12... c5". */
            readonly move: string;
            readonly side: components["schemas"]["Side"];
            /**
             * @description A king’s or rook’s move is one where it gives up castling.
             * @enum {string}
             */
            readonly act: "pawn-move" | "capture" | "promotion" | "king-move" | "rook-move";
            /** @description One a feature; it still stands two half-moves later, or the game is over. */
            readonly changes: readonly {
                readonly kind: components["schemas"]["FeatureKind"];
                /** @description Whose it is: who suffers from a weakness, who has the rest; null: both. */
                readonly side: components["schemas"]["Side"] | null;
                /** @description Its squares, those of pawns as they stand there. */
                readonly squares: readonly components["schemas"]["Square"][];
                /** @description Weak squares and outposts: for good, or while the pawns that could come are stopped; else null. */
                readonly hold: ("permanent" | "fixed") | null;
                /** @description The claim, without full stop. */
                readonly text: string;
                /** @description Made by the move; else ended. */
                readonly made: boolean;
            }[];
            /** @description The move and its changes in sentences, those of one kind together. */
            readonly text: string;
        };
        /** @description Two to four positions or placements side by side. */
        readonly Comparison: {
            readonly engine: string;
            /** @description What was compared, each as a position; the first is the one the others are held against. */
            readonly subjects: readonly {
                readonly fen: string;
                readonly label: string;
            }[];
            /** @description From the first subject to each of the others, in order. */
            readonly differences: readonly components["schemas"]["Difference"][];
        };
        /** @description Two to four positions or placements. */
        readonly ComparisonRequest: {
            /** @description Positions or placements; the first is the one the others are held against. */
            readonly subjects: readonly {
                readonly fen: components["schemas"]["Fen"];
                /** @description One man put elsewhere, whether or not it could move there. */
                readonly place?: {
                    readonly from: components["schemas"]["Square"];
                    readonly to: components["schemas"]["Square"];
                };
                readonly label?: string;
            }[];
            /** @default diagram */
            readonly mode?: components["schemas"]["Mode"];
        };
        /** @description How far a bishop or queen sees along a diagonal, one way. */
        readonly DiagonalReading: {
            readonly from: components["schemas"]["Square"];
            /** @enum {string} */
            readonly direction: "a1h8" | "h1a8";
            /** @description Squares seen along the diagonal from the man, nearest first, one way. */
            readonly squares: readonly components["schemas"]["Square"][];
            readonly stoppedBy: components["schemas"]["Square"] | null;
            /** @description The man that stops it is a rammed pawn. */
            readonly stopperFixed: boolean;
        };
        /** @description All that differs from A to B. */
        readonly Difference: {
            readonly squares: readonly components["schemas"]["SquareDifference"][];
            readonly men: readonly components["schemas"]["ManDifference"][];
            readonly balance: readonly components["schemas"]["BalanceLine"][];
            /** @description Statements of B that A does not make word for word. */
            readonly gained: readonly components["schemas"]["Statement"][];
            /** @description Statements of A that B does not make. */
            readonly lost: readonly components["schemas"]["Statement"][];
            /** @description How many statements both make. */
            readonly unchanged: number;
            /** @description Best said first. */
            readonly sentences: readonly components["schemas"]["DifferenceSentence"][];
        };
        /** @description A sentence of the difference. */
        readonly DifferenceSentence: {
            /** @description Stable id of what is said, e.g. "last-guard-gone". */
            readonly id: string;
            /** @enum {string} */
            readonly theme: "structure" | "squares" | "outposts" | "files" | "men" | "king" | "control";
            /** @description Whose gain or loss it is; null: of both. */
            readonly side: components["schemas"]["Side"] | null;
            /** @description Good for that side; where it is of both: there is more of it. */
            readonly good: boolean;
            /** @description Only orders. */
            readonly weight: number;
            readonly text: string;
            readonly squares: readonly components["schemas"]["Square"][];
            /** @description Men of B that it points at. */
            readonly men: readonly components["schemas"]["Square"][];
            /** @description What the text is made from. */
            readonly facts: {
                readonly [key: string]: unknown;
            };
        };
        /** @description One trade and what it changes. */
        readonly Exchange: {
            readonly white: {
                readonly square: components["schemas"]["Square"];
                readonly kind: components["schemas"]["Kind"];
            };
            readonly black: {
                readonly square: components["schemas"]["Square"];
                readonly kind: components["schemas"]["Kind"];
            };
            /** @description Own safe moves until each side’s man attacks the other; 0: now; null: not within three. */
            readonly offers: {
                readonly white: number | null;
                readonly black: number | null;
            };
            /** @description The position with both gone. */
            readonly fen: string;
            readonly balance: readonly components["schemas"]["BalanceLine"][];
            /** @description Themes whose balance moves towards each side. */
            readonly themes: {
                readonly white: number;
                readonly black: number;
            };
            /** @description What is said for and against each side, counted and weighed. */
            readonly reasons: readonly {
                /** @description As in the sentences. */
                readonly id: string;
                readonly side: components["schemas"]["Side"];
                readonly good: boolean;
                /** @description How many such sentences. */
                readonly times: number;
                /** @description What they add up to; below 0 where they speak against the side. */
                readonly points: number;
            }[];
            /** @description The points of the reasons of each side, added up; only orders. */
            readonly points: {
                readonly white: number;
                readonly black: number;
            };
            /** @description The side that the trade helps by those points; null: neither. */
            readonly helps: components["schemas"]["Side"] | null;
            readonly sentences: readonly components["schemas"]["DifferenceSentence"][];
        };
        /** @description Every trade of men of like worth. */
        readonly ExchangeTest: {
            readonly engine: string;
            readonly fen: string;
            /** @description White’s men that can be traded: the rows. */
            readonly white: readonly {
                readonly square: components["schemas"]["Square"];
                readonly kind: components["schemas"]["Kind"];
            }[];
            /** @description Black’s men that can be traded: the columns. */
            readonly black: readonly {
                readonly square: components["schemas"]["Square"];
                readonly kind: components["schemas"]["Kind"];
            }[];
            /** @description Row by row; pairs of unlike worth are left out. */
            readonly exchanges: readonly components["schemas"]["Exchange"][];
        };
        /** @description A position whose trades are to be tested. */
        readonly ExchangesRequest: {
            readonly fen: components["schemas"]["Fen"];
            /** @default diagram */
            readonly mode?: components["schemas"]["Mode"];
        };
        /** @description Why a position was refused, or what a diagram lacks. */
        readonly Fault: {
            /** @description Stable code of the fault, e.g. "rank-length". */
            readonly code: string;
            /**
             * @description The FEN field at fault; "text" when the fields cannot be told apart.
             * @enum {string}
             */
            readonly field: "board" | "side" | "castling" | "enPassant" | "halfmove" | "fullmove" | "text";
            /** @description What is wrong, in a sentence. */
            readonly message: string;
            /** @description The square at fault, where there is one. */
            readonly square?: components["schemas"]["Square"];
        };
        /**
         * @description A kind of lasting feature.
         * @enum {string}
         */
        readonly FeatureKind: "structure" | "weak-square" | "outpost" | "open-file" | "half-open-file" | "bishop-pair" | "passed-pawn" | "isolated-pawn" | "backward-pawn" | "doubled-pawn" | "weak-complex" | "ram" | "castling-lost";
        /** @description A position in Forsyth-Edwards notation, with six fields or, as in EPD, four. */
        readonly Fen: string;
        /**
         * @description A file by its letter.
         * @enum {string}
         */
        readonly File: "a" | "b" | "c" | "d" | "e" | "f" | "g" | "h";
        /** @description One file. */
        readonly FileReading: {
            readonly file: components["schemas"]["File"];
            /** @enum {string} */
            readonly status: "open" | "half-open" | "closed";
            readonly halfOpenFor: components["schemas"]["Side"] | null;
            /** @description Rooks and queens on the file. */
            readonly heavy: {
                readonly white: readonly components["schemas"]["Square"][];
                readonly black: readonly components["schemas"]["Square"][];
            };
            /** @enum {string} */
            readonly control: "white" | "black" | "shared" | "none";
            /** @description Squares on the 7th and 8th rank of each side where it can enter. */
            readonly entries: {
                readonly white: readonly components["schemas"]["Square"][];
                readonly black: readonly components["schemas"]["Square"][];
            };
            readonly targets: readonly {
                readonly square: components["schemas"]["Square"];
                readonly side: components["schemas"]["Side"];
            }[];
        };
        /** @description Why a game was not kept, and where. */
        readonly GameFault: {
            /** @description Its number in the text. */
            readonly game: number;
            /** @description Line of the text, from 1. */
            readonly line: number;
            /** @description The move at fault with its number; null where no move is. */
            readonly move: string | null;
            /** @description Stable within v1, as "illegal-move". */
            readonly code: string;
            /** @description A sentence. */
            readonly message: string;
        };
        /** @description A game: timeline, journeys, commitments, origins. */
        readonly GameReading: {
            /** @description Its number in the text. */
            readonly game: number;
            /** @description Its PGN tags by name. */
            readonly tags: {
                readonly [key: string]: string;
            };
            /** @enum {string} */
            readonly result: "1-0" | "0-1" | "1/2-1/2" | "*";
            /** @description Half-moves of the main line. */
            readonly plies: number;
            /** @description One a position, the start first. */
            readonly timeline: readonly components["schemas"]["TimelinePly"][];
            /** @description One a man, in square order of where they began. */
            readonly journeys: readonly components["schemas"]["Journey"][];
            /** @description In the order of the game. */
            readonly commitments: readonly components["schemas"]["Commitment"][];
            /** @description One a lasting feature of the last position. */
            readonly origins: readonly components["schemas"]["Origin"][];
        };
        /** @description The games that could be read, and why the others could not. */
        readonly GamesAnswer: {
            readonly engine: string;
            readonly games: readonly components["schemas"]["GameReading"][];
            readonly faults: readonly components["schemas"]["GameFault"][];
        };
        /** @description Games to be read. */
        readonly GamesRequest: {
            /** @description One game or several, with comments, variations and glyphs. */
            readonly pgn: string;
        };
        readonly Health: {
            /** @enum {string} */
            readonly status: "ready";
            /** @description Version of the computations. */
            readonly engine: string;
            readonly uptimeSeconds: number;
        };
        /**
         * Format: uuid
         * @description An id of something stored.
         */
        readonly Id: string;
        /** @description How far long work is. */
        readonly Job: {
            readonly id: components["schemas"]["Id"];
            readonly kind: string;
            /** @enum {string} */
            readonly state: "queued" | "running" | "done" | "failed" | "cancelled";
            /** @description Items in all: positions or games. */
            readonly total: number;
            readonly done: number;
            /** @description Items that were refused; each says why. */
            readonly failed: number;
            readonly error: string | null;
            readonly createdAt: components["schemas"]["Moment"];
            readonly startedAt: components["schemas"]["Moment"] | null;
            readonly endedAt: components["schemas"]["Moment"] | null;
        };
        /** @description One item of long work. */
        readonly JobItem: {
            /** @description From 1, in the order of the request. */
            readonly number: number;
            /** @enum {string} */
            readonly state: "queued" | "done" | "failed";
            /** @description What was made, or {"error": …} saying why it was refused. */
            readonly output: unknown;
        };
        /** @description Items of a job, in order. */
        readonly JobItems: {
            readonly items: readonly components["schemas"]["JobItem"][];
            /** @description "after" of the next page; null at the end. */
            readonly next: number | null;
        };
        /** @description A page of a list. */
        readonly JobPage: {
            readonly items: readonly components["schemas"]["Job"][];
            /** @description The cursor of the next page; null at the end. */
            readonly next: string | null;
        };
        /** @description Long work to be done. */
        readonly JobRequest: {
            /** @constant */
            readonly kind: "readings";
            /** @description Positions to be read; each reading is kept, so that asking for it later answers at once. */
            readonly fens: readonly string[];
        } | {
            /** @constant */
            readonly kind: "import";
            readonly study: components["schemas"]["Id"];
            /**
             * @description fens: one a line, a title may follow a tab. pgn: games.
             * @enum {string}
             */
            readonly format: "fens" | "pgn";
            readonly text: string;
        } | {
            /** @constant */
            readonly kind: "recompute";
            /** @description Readings and results of this study that an older engine made are made anew. */
            readonly study: components["schemas"]["Id"];
        };
        /** @description One man’s way through the game. */
        readonly Journey: {
            readonly side: components["schemas"]["Side"];
            /** @description The kind it began as. */
            readonly kind: components["schemas"]["Kind"];
            readonly start: components["schemas"]["Square"];
            /** @description Where it stood, how long. */
            readonly stays: readonly {
                readonly square: components["schemas"]["Square"];
                /** @description Half-moves played. */
                readonly from: number;
                readonly plies: number;
            }[];
            /** @description The half-move that took it; null: it is there at the end. */
            readonly takenAt: number | null;
            /** @description What it became, and at which half-move. */
            readonly promoted: {
                readonly kind: components["schemas"]["Kind"];
                readonly at: number;
            } | null;
        };
        /** @description A key, without the secret: that is shown once, when it is made. */
        readonly Key: {
            readonly id: components["schemas"]["Id"];
            readonly name: string;
            /** @description The beginning of the key, by which it can be recognised. */
            readonly prefix: string;
            readonly scopes: readonly components["schemas"]["KeyScope"][];
            readonly createdAt: components["schemas"]["Moment"];
            readonly expiresAt: components["schemas"]["Moment"] | null;
            readonly revokedAt: components["schemas"]["Moment"] | null;
            readonly usedAt: components["schemas"]["Moment"] | null;
        };
        /** @description All keys. */
        readonly KeyList: {
            readonly items: readonly components["schemas"]["Key"][];
        };
        /** @description A key to be made. */
        readonly KeyRequest: {
            /** @description By which its owners know what it is for. */
            readonly name: string;
            readonly scopes: readonly components["schemas"]["KeyScope"][];
            /**
             * @description For how many days it is good.
             * @default 90
             */
            readonly days?: number;
        };
        /**
         * @description What a key may do.
         * @enum {string}
         */
        readonly KeyScope: "compute" | "studies:read" | "studies:write" | "publish";
        /**
         * @description A kind of man.
         * @enum {string}
         */
        readonly Kind: "pawn" | "knight" | "bishop" | "rook" | "queen" | "king";
        /** @description A king and its shelter. */
        readonly KingReading: {
            readonly square: components["schemas"]["Square"];
            readonly shelter: readonly {
                readonly file: components["schemas"]["File"];
                readonly pawn: components["schemas"]["Square"] | null;
                readonly advanced: number;
            }[];
            /** @description Files of the king and beside it, open or half-open for the enemy. */
            readonly openBeside: readonly components["schemas"]["File"][];
            /** @description Enemy men that attack its zone. */
            readonly reachedBy: readonly components["schemas"]["Square"][];
            /** @description Own men that guard its zone. */
            readonly guardedBy: readonly components["schemas"]["Square"][];
            /** @description Squares it can step to now. */
            readonly flights: readonly components["schemas"]["Square"][];
            /** @description Flights off its back rank. */
            readonly luft: readonly components["schemas"]["Square"][];
            /** @description Own pawn moves that would give it its first luft. */
            readonly luftMoves: readonly {
                readonly from: components["schemas"]["Square"];
                readonly to: components["schemas"]["Square"];
            }[];
            /** @description No luft, no own rook or queen on the back rank, and the enemy has one. */
            readonly weakBackRank: boolean;
        };
        /** @description One call of the API. */
        readonly Link: {
            readonly id: string;
            readonly method: string;
            readonly href: string;
            readonly summary: string;
        };
        /** @description A man that stands elsewhere, is gone or new, or whose counts differ. */
        readonly ManDifference: {
            readonly side: components["schemas"]["Side"];
            readonly kind: components["schemas"]["Kind"];
            /** @description Where it stands; null: not on the board. */
            readonly squares: {
                /** @description Before. */
                readonly a: components["schemas"]["Square"] | null;
                /** @description After. */
                readonly b: components["schemas"]["Square"] | null;
            };
            readonly counts: {
                /** @description Before. */
                readonly a: {
                    readonly safeMoves: number;
                    /** @description Squares attacked in the enemy half. */
                    readonly enemyHalf: number;
                    readonly attackers: number;
                    readonly defenders: number;
                    /** @description Pawns the enemy gains by taking it now. */
                    readonly enPrise: number;
                } | null;
                /** @description After. */
                readonly b: {
                    readonly safeMoves: number;
                    /** @description Squares attacked in the enemy half. */
                    readonly enemyHalf: number;
                    readonly attackers: number;
                    readonly defenders: number;
                    /** @description Pawns the enemy gains by taking it now. */
                    readonly enPrise: number;
                } | null;
            };
        };
        /** @description One man and what it can do from where it stands. */
        readonly ManReading: {
            readonly square: components["schemas"]["Square"];
            readonly side: components["schemas"]["Side"];
            readonly kind: components["schemas"]["Kind"];
            /** @description Squares it can move to: pseudo-legal, pins kept. */
            readonly moves: readonly components["schemas"]["Square"][];
            /** @description Those of its moves on which it is not lost by exchange. */
            readonly safeMoves: readonly components["schemas"]["Square"][];
            /** @description Squares attacked, own men included. */
            readonly sees: number;
            /** @description Of these, squares on ranks ahead of it. */
            readonly seesAhead: number;
            readonly pinned: boolean;
            /** @description Pawns the enemy gains by taking it now; 0 if nothing. */
            readonly enPrise: number;
            /** @description Enemy men that attack it, cheapest first. */
            readonly attackers: readonly components["schemas"]["Square"][];
            /** @description Own men that guard it, cheapest first. */
            readonly defenders: readonly components["schemas"]["Square"][];
            /** @description What falls if it leaves. */
            readonly duties: readonly {
                readonly square: components["schemas"]["Square"];
                /** @description Pawns lost there if the man leaves. */
                readonly loses: number;
                /**
                 * @description It guards the man, or shuts the line of an enemy slider.
                 * @enum {string}
                 */
                readonly by: "guard" | "screen";
            }[];
            /** @description Attackable and without a safe square. */
            readonly trapped: boolean;
            /** @description Named traits: bad-bishop, bad-but-active, rim, outpost, overloaded and others. */
            readonly notes: readonly string[];
        };
        /** @description Something a person marks on a plate. */
        readonly Mark: {
            readonly square: components["schemas"]["Square"];
            /** @description Given: a trail from the square to this one; else a ring on the square. */
            readonly to?: components["schemas"]["Square"];
            readonly text?: string;
        };
        /**
         * @description strict: legal positions only. diagram: also what teachers draw, the faults answered as warnings.
         * @enum {string}
         */
        readonly Mode: "strict" | "diagram";
        /**
         * Format: date-time
         * @description A moment in UTC (RFC 3339).
         */
        readonly Moment: string;
        /** @description A key that was just made. */
        readonly NewKey: {
            readonly key: components["schemas"]["Key"];
            /** @description The key itself. It is shown this once and never stored. */
            readonly secret: string;
        };
        /** @description A lasting feature of the last position, and the move since which it stands. */
        readonly Origin: {
            readonly kind: components["schemas"]["FeatureKind"];
            /** @description Whose it is: who suffers from a weakness, who has the rest; null: both. */
            readonly side: components["schemas"]["Side"] | null;
            /** @description Its squares, those of pawns as they stand there. */
            readonly squares: readonly components["schemas"]["Square"][];
            /** @description Weak squares and outposts: for good, or while the pawns that could come are stopped; else null. */
            readonly hold: ("permanent" | "fixed") | null;
            /** @description The claim, without full stop. */
            readonly text: string;
            /** @description 0: there from the beginning. */
            readonly ply: number;
            readonly move: string | null;
        };
        /** @description An outpost or advanced post. */
        readonly Outpost: {
            readonly square: components["schemas"]["Square"];
            /** @description The side that may use it. */
            readonly side: components["schemas"]["Side"];
            /**
             * @description "advanced": a pawn may still challenge it, or no pawn supports it.
             * @enum {string}
             */
            readonly rank: "outpost" | "advanced";
            /** @description On the side’s 7th rank. */
            readonly deep: boolean;
            /** @enum {string} */
            readonly hold: "permanent" | "fixed" | "open";
            /** @description The soonest enemy pawn that can attack it. */
            readonly challenge: {
                readonly from: components["schemas"]["Square"];
                readonly moves: number;
            } | null;
            /** @description The soonest own pawn that can guard it; moves 0: it does now. */
            readonly support: {
                readonly pawn: components["schemas"]["Square"];
                readonly moves: number;
            } | null;
            /** @description The square itself when an own man stands there. */
            readonly occupant: components["schemas"]["Square"] | null;
            readonly users: readonly {
                /** @description Where the man stands now. */
                readonly from: components["schemas"]["Square"];
                readonly kind: components["schemas"]["Kind"];
                /** @description Own moves needed to stand there safely, the enemy standing still; 0: it stands there. */
                readonly moves: number;
            }[];
            /** @description The enemy has a minor piece that can challenge it. */
            readonly tradable: boolean;
        };
        /** @description The pawns of one side. */
        readonly PawnSide: {
            readonly islands: number;
            readonly isolated: readonly components["schemas"]["Square"][];
            readonly doubled: readonly components["schemas"]["Square"][];
            readonly backward: readonly components["schemas"]["Square"][];
            readonly passed: readonly components["schemas"]["Square"][];
            readonly protectedPassed: readonly components["schemas"]["Square"][];
            readonly candidates: readonly components["schemas"]["Square"][];
            readonly onLight: number;
            readonly onDark: number;
            /** @description Wings (a to c, d to e, f to h) where this side has more pawns. */
            readonly majorities: readonly ("queenside" | "centre" | "kingside")[];
        };
        /** @description The fields that change; the others stay. */
        readonly PositionChange: {
            readonly fen?: components["schemas"]["Fen"];
            readonly title?: string;
            /** @description Markdown. */
            readonly note?: string;
            readonly marks?: readonly components["schemas"]["Mark"][];
            /** @description The layer its plate shows; null: the reader’s choice. */
            readonly layer?: ("position" | "control" | "command" | "weak" | "outposts" | "files" | "mobility" | "routes") | null;
            readonly man?: components["schemas"]["Square"] | null;
            readonly after?: components["schemas"]["Id"] | null;
        };
        readonly PositionList: {
            readonly items: readonly components["schemas"]["StudyPosition"][];
        };
        /** @description A position to be kept in a study. */
        readonly PositionRequest: {
            readonly fen: components["schemas"]["Fen"];
            /** @default  */
            readonly title?: string;
            /**
             * @description Markdown.
             * @default
             */
            readonly note?: string;
            /** @default [] */
            readonly marks?: readonly components["schemas"]["Mark"][];
            /**
             * @description The layer its plate shows; null: the reader’s choice.
             * @default null
             */
            readonly layer?: ("position" | "control" | "command" | "weak" | "outposts" | "files" | "mobility" | "routes") | null;
            /**
             * @description The man whose layer is shown.
             * @default null
             */
            readonly man?: components["schemas"]["Square"] | null;
            /** @description The position it is put behind; null: at the beginning; left out: at the end. */
            readonly after?: components["schemas"]["Id"] | null;
        };
        /** @description Problem details (RFC 9457). */
        readonly Problem: {
            /** @description Stable address of the kind of problem. */
            readonly type: string;
            /** @description The kind of problem in a sentence, the same each time. */
            readonly title: string;
            readonly status: number;
            /** @description What is wrong this time. */
            readonly detail: string;
            /** @description The address that was called. */
            readonly instance: string;
            readonly code: components["schemas"]["ProblemCode"];
            /** @description Also in the X-Request-Id header and in our log. */
            readonly requestId: string;
            /** @description What to do. */
            readonly fix: string;
            /** @description The path of the first fault. */
            readonly path?: string;
            readonly bound?: components["schemas"]["Bound"];
            readonly faults?: readonly components["schemas"]["ProblemFault"][];
        };
        /**
         * @description A stable code of a problem.
         * @enum {string}
         */
        readonly ProblemCode: "not-json" | "not-signed-in" | "not-allowed" | "not-found" | "method-not-allowed" | "conflict" | "idempotency-busy" | "version-lost" | "body-too-large" | "unsupported-media-type" | "invalid-request" | "fen-refused" | "pgn-refused" | "idempotency-mismatch" | "version-needed" | "too-many-requests" | "internal";
        /** @description One place of a request that was refused. */
        readonly ProblemFault: {
            /**
             * @description The part of the request at fault.
             * @enum {string}
             */
            readonly in: "body" | "query" | "path";
            /** @description JSON pointer (RFC 6901) to the value at fault inside that part, e.g. "/fens/3". */
            readonly path: string;
            /** @description Stable code of the fault, e.g. "unknown-field" or, for a FEN, "rank-length". */
            readonly code: string;
            /** @description What is wrong, in a sentence. */
            readonly message: string;
            /** @description For a FEN: its field at fault. */
            readonly field?: string;
            /** @description For a FEN: the square at fault, where there is one. */
            readonly square?: components["schemas"]["Square"];
        };
        /** @description A kind of problem, and what to do about it. */
        readonly ProblemKind: {
            readonly type: string;
            readonly code: components["schemas"]["ProblemCode"];
            readonly status: number;
            readonly title: string;
            readonly fix: string;
        };
        /** @description Everything computed for one position. */
        readonly Reading: {
            /** @description Version of the computations. */
            readonly engine: string;
            /** @description Six fields, normalised. */
            readonly fen: string;
            /** @enum {string} */
            readonly mode: "strict" | "diagram";
            readonly warnings: readonly components["schemas"]["Fault"][];
            readonly sideToMove: components["schemas"]["Side"];
            /** @description 64, a1 first, then b1 … h8. */
            readonly squares: readonly components["schemas"]["SquareReading"][];
            /** @description One a man, in square order. */
            readonly men: readonly components["schemas"]["ManReading"][];
            readonly pawns: {
                readonly white: components["schemas"]["PawnSide"];
                readonly black: components["schemas"]["PawnSide"];
                readonly rams: readonly {
                    readonly white: components["schemas"]["Square"];
                    readonly black: components["schemas"]["Square"];
                }[];
                readonly levers: readonly {
                    readonly from: components["schemas"]["Square"];
                    readonly against: components["schemas"]["Square"];
                    readonly side: components["schemas"]["Side"];
                    readonly moves: number;
                    readonly supported: boolean;
                }[];
                readonly fixedness: {
                    readonly all: number | null;
                    readonly centre: number | null;
                };
                readonly structure: {
                    readonly id: string;
                    readonly name: string;
                    /** @description The side that has the structure’s leading part. */
                    readonly side: components["schemas"]["Side"];
                    /** @description Pawns that differ from the model. */
                    readonly differs: number;
                } | null;
            };
            readonly weakSquares: readonly components["schemas"]["WeakSquare"][];
            readonly outposts: readonly components["schemas"]["Outpost"][];
            /** @description 8, a first. */
            readonly files: readonly components["schemas"]["FileReading"][];
            readonly diagonals: readonly components["schemas"]["DiagonalReading"][];
            readonly colourComplexes: readonly {
                readonly side: components["schemas"]["Side"];
                readonly colour: components["schemas"]["Colour"];
                readonly squares: readonly components["schemas"]["Square"][];
                readonly ownBishop: boolean;
                readonly enemyBishop: boolean;
            }[];
            readonly kings: {
                readonly white: components["schemas"]["KingReading"] | null;
                readonly black: components["schemas"]["KingReading"] | null;
            };
            readonly totals: {
                readonly white: components["schemas"]["Totals"];
                readonly black: components["schemas"]["Totals"];
            };
            /** @description By weight, heaviest first. */
            readonly statements: readonly components["schemas"]["Statement"][];
            /** @description Keys of the few statements that matter most. */
            readonly lead: readonly string[];
        };
        /**
         * @description A part of a reading.
         * @enum {string}
         */
        readonly ReadingPart: "squares" | "men" | "pawns" | "weakSquares" | "outposts" | "files" | "diagonals" | "colourComplexes" | "kings" | "totals" | "statements" | "lead";
        /** @description A reading with the parts that were asked for. */
        readonly ReadingParts: {
            /** @description Version of the computations. */
            readonly engine: string;
            /** @description Six fields, normalised. */
            readonly fen: string;
            /** @enum {string} */
            readonly mode: "strict" | "diagram";
            readonly warnings: readonly components["schemas"]["Fault"][];
            readonly sideToMove: components["schemas"]["Side"];
            /** @description 64, a1 first, then b1 … h8. */
            readonly squares?: readonly components["schemas"]["SquareReading"][];
            /** @description One a man, in square order. */
            readonly men?: readonly components["schemas"]["ManReading"][];
            readonly pawns?: {
                readonly white: components["schemas"]["PawnSide"];
                readonly black: components["schemas"]["PawnSide"];
                readonly rams: readonly {
                    readonly white: components["schemas"]["Square"];
                    readonly black: components["schemas"]["Square"];
                }[];
                readonly levers: readonly {
                    readonly from: components["schemas"]["Square"];
                    readonly against: components["schemas"]["Square"];
                    readonly side: components["schemas"]["Side"];
                    readonly moves: number;
                    readonly supported: boolean;
                }[];
                readonly fixedness: {
                    readonly all: number | null;
                    readonly centre: number | null;
                };
                readonly structure: {
                    readonly id: string;
                    readonly name: string;
                    /** @description The side that has the structure’s leading part. */
                    readonly side: components["schemas"]["Side"];
                    /** @description Pawns that differ from the model. */
                    readonly differs: number;
                } | null;
            };
            readonly weakSquares?: readonly components["schemas"]["WeakSquare"][];
            readonly outposts?: readonly components["schemas"]["Outpost"][];
            /** @description 8, a first. */
            readonly files?: readonly components["schemas"]["FileReading"][];
            readonly diagonals?: readonly components["schemas"]["DiagonalReading"][];
            readonly colourComplexes?: readonly {
                readonly side: components["schemas"]["Side"];
                readonly colour: components["schemas"]["Colour"];
                readonly squares: readonly components["schemas"]["Square"][];
                readonly ownBishop: boolean;
                readonly enemyBishop: boolean;
            }[];
            readonly kings?: {
                readonly white: components["schemas"]["KingReading"] | null;
                readonly black: components["schemas"]["KingReading"] | null;
            };
            readonly totals?: {
                readonly white: components["schemas"]["Totals"];
                readonly black: components["schemas"]["Totals"];
            };
            /** @description By weight, heaviest first. */
            readonly statements?: readonly components["schemas"]["Statement"][];
            /** @description Keys of the few statements that matter most. */
            readonly lead?: readonly string[];
        };
        /** @description One position to read. */
        readonly ReadingRequest: {
            readonly fen: components["schemas"]["Fen"];
            /** @default strict */
            readonly mode?: components["schemas"]["Mode"];
            /** @description Only these parts, beside the position itself. Left out: the whole reading. */
            readonly include?: readonly components["schemas"]["ReadingPart"][];
        };
        /** @description What to restore. */
        readonly RestoreRequest: {
            /** @description The version to go back to; left out: out of the trash as it was. */
            readonly version?: number;
        };
        /** @description The words that change; request and result stay. */
        readonly ResultChange: {
            /** @default  */
            readonly title?: string;
            /**
             * @description Markdown.
             * @default
             */
            readonly note?: string;
        };
        /** @description A route that a person gave, step by step. */
        readonly RouteCheck: {
            readonly engine: string;
            readonly fen: string;
            readonly side: components["schemas"]["Side"];
            readonly man: components["schemas"]["Square"];
            readonly kind: components["schemas"]["Kind"];
            /** @description Steps in order; none after one that is no move. */
            readonly steps: readonly components["schemas"]["CheckedStep"][];
            /** @description Place of the first step that is not fine, from 0. */
            readonly firstFault: number | null;
            /** @description All steps are fine. */
            readonly holds: boolean;
        };
        /** @description A route to be checked step by step. */
        readonly RouteCheckRequest: {
            readonly fen: components["schemas"]["Fen"];
            /** @description Squares, the man's own first, e.g. f3, d2, f1; or its moves in SAN, e.g. Nd2, Nf1. */
            readonly route: readonly string[];
        };
        /** @description A man, a post, and the way there. */
        readonly RouteChoice: {
            readonly man: components["schemas"]["Square"];
            readonly kind: components["schemas"]["Kind"];
            readonly post: components["schemas"]["Square"];
            /** @description Own moves of the man: as many as stops. */
            readonly moves: number;
            /** @description The shown route, from the first stop to the post. */
            readonly stops: readonly components["schemas"]["Square"][];
            /** @description How many safe routes of this length there are. */
            readonly shortest: number;
            readonly steps: readonly components["schemas"]["RouteStep"][];
            /** @description The counts that rank it, with the man where it stands and on the post. */
            readonly parts: {
                readonly [key: string]: {
                    readonly now: number;
                    readonly there: number;
                };
            };
            /** @description Weighted sum of the differences, with the weights of the documented table. */
            readonly gain: number;
            /** @description Soonest the enemy can dispute the post; 0 moves: he does. */
            readonly challenge: {
                readonly by: components["schemas"]["Square"];
                readonly kind: components["schemas"]["Kind"];
                readonly moves: number;
            } | null;
            /** @description Duties left behind. */
            readonly drops: readonly {
                readonly square: components["schemas"]["Square"];
                readonly loses: number;
            }[];
            /** @description Own moves, in SAN, that make the route possible or shorter; total moves with them. */
            readonly preparations: readonly {
                readonly move: string;
                readonly moves: number;
            }[];
            /** @description The preparation that must be played first; null where none must. */
            readonly needs: string | null;
            readonly guard: components["schemas"]["RouteGuard"];
            /** @description The same in sentences. */
            readonly text: string;
        };
        /** @description A safeguard, no opinion: a small exact search over captures, checks and promotions. */
        readonly RouteGuard: {
            /**
             * @description Whether something is lost by force, the enemy to move; "unknown": the search gave up.
             * @enum {string}
             */
            readonly verdict: "holds" | "loses" | "unknown";
            /** @description The moves that show the loss, in SAN, the enemy first. */
            readonly line: readonly string[];
            /** @description Pawns lost; 200 stands for mate; 0 where it holds. */
            readonly loses: number;
        };
        /** @description One stop of a route. */
        readonly RouteStep: {
            readonly to: components["schemas"]["Square"];
            /** @description The enemy gains nothing by capturing the man there. */
            readonly safe: boolean;
            /** @description Enemy men that attack it there, cheapest first. */
            readonly attackedBy: readonly components["schemas"]["Square"][];
            /** @description Own men that guard it there, cheapest first. */
            readonly guardedBy: readonly components["schemas"]["Square"][];
            /** @description The enemy pawn that can hit it there soonest, and in how many pawn moves. */
            readonly pawnHit: {
                readonly from: components["schemas"]["Square"];
                readonly moves: number;
            } | null;
        };
        /** @description Where a side’s men belong and how they get there. */
        readonly RoutesAnswer: {
            readonly engine: string;
            readonly fen: string;
            readonly side: components["schemas"]["Side"];
            /** @description What one more of each part counts: the documented table by which the choices are ranked. */
            readonly weights: {
                readonly [key: string]: number;
            };
            /** @description Best first; one a man and post. */
            readonly choices: readonly components["schemas"]["RouteChoice"][];
        };
        /** @description A position, and whose men are to be placed. */
        readonly RoutesRequest: {
            readonly fen: components["schemas"]["Fen"];
            /** @description Square of the one knight, bishop, rook or queen to be placed. Left out: all men of the side. */
            readonly man?: components["schemas"]["Square"];
            /** @description Whose men. Left out: the side of the man, else the side to move. */
            readonly side?: components["schemas"]["Side"];
            /**
             * @description The longest route, in moves of the man.
             * @default 4
             */
            readonly movesMax?: number;
            /**
             * @description The most choices answered.
             * @default 12
             */
            readonly choicesMax?: number;
        };
        /** @description With whom a study is shared. */
        readonly Shares: {
            /** @description Ids of the students who may read the study. */
            readonly students: readonly components["schemas"]["Id"][];
        };
        /** @description What of a structure sheet holds in a position. */
        readonly SheetAnswer: {
            /** @description Version of the computations. */
            readonly engine: string;
            /** @description The position, six fields, normalised. */
            readonly fen: string;
            /** @description The sheet of the named structure; null where the pawns have no name. */
            readonly sheet: {
                /** @description Id of the structure. */
                readonly id: string;
                /** @description Its name. */
                readonly name: string;
                /** @description The side that has the leading part here. */
                readonly side: components["schemas"]["Side"];
                /** @description Pawns that differ from the model. */
                readonly differs: number;
                /** @description What the structure means, in a clause. */
                readonly lead: string;
                /** @description White’s part. */
                readonly white: components["schemas"]["SheetSideHeld"];
                /** @description Black’s part. */
                readonly black: components["schemas"]["SheetSideHeld"];
                /** @description Books that treat it. */
                readonly books: readonly components["schemas"]["SheetBook"][];
            } | null;
        };
        /** @description A handbook that treats the structure; author, title and year from memory. */
        readonly SheetBook: {
            /** @description Who wrote it. */
            readonly author: string;
            /** @description Its title. */
            readonly title: string;
            /** @description Year of the first edition, or of the first in English. */
            readonly year: number;
        };
        /** @description A key square, and who holds it. */
        readonly SheetKeySquareHeld: {
            /** @description The key square. */
            readonly square: components["schemas"]["Square"];
            /** @description Who stands on the square now; null for nobody. */
            readonly occupant: {
                /** @description Whose man it is. */
                readonly side: components["schemas"]["Side"];
                /** @description What it is. */
                readonly kind: components["schemas"]["Kind"];
            } | null;
            /** @description Men that attack it, cheapest first. */
            readonly attackers: {
                readonly white: readonly components["schemas"]["Square"][];
                readonly black: readonly components["schemas"]["Square"][];
            };
            /** @description The one side whose knight would be safe there; null where both sides’ would, or neither’s. */
            readonly controller: components["schemas"]["Side"] | null;
        };
        /** @description A pawn’s attack on an enemy pawn. */
        readonly SheetLever: {
            /** @description The square from which the pawn attacks. */
            readonly on: components["schemas"]["Square"];
            /** @description The enemy pawn’s square that it attacks from there. */
            readonly against: components["schemas"]["Square"];
        };
        /** @description A lever, and whether it is to be had. */
        readonly SheetLeverHeld: {
            /** @description The square from which the pawn attacks. */
            readonly on: components["schemas"]["Square"];
            /** @description The enemy pawn’s square that it attacks from there. */
            readonly against: components["schemas"]["Square"];
            /**
             * @description ready: attacks now; needs-moves; blocked: men on the road; impossible: see fault.
             * @enum {string}
             */
            readonly state: "ready" | "needs-moves" | "blocked" | "impossible";
            /** @description no-pawn: none can come; no-target: nothing to attack; rammed: an enemy pawn on the road. */
            readonly fault: ("no-pawn" | "no-target" | "rammed") | null;
            /** @description The pawn that makes it. */
            readonly from: components["schemas"]["Square"] | null;
            /** @description Pawn moves to the square, the double step being one. */
            readonly moves: number | null;
            /** @description Men on the road, nearest first. */
            readonly blockers: readonly components["schemas"]["Square"][];
            /** @description Another own pawn guards the square, as things stand. */
            readonly supported: boolean;
        };
        /** @description A man and its usual square. */
        readonly SheetPost: {
            /** @description The kind of man that belongs there. */
            readonly kind: components["schemas"]["Kind"];
            /** @description Its usual square. */
            readonly square: components["schemas"]["Square"];
        };
        /** @description A post, who stands there and who can come. */
        readonly SheetPostHeld: {
            /** @description The kind of man that belongs there. */
            readonly kind: components["schemas"]["Kind"];
            /** @description Its usual square. */
            readonly square: components["schemas"]["Square"];
            /**
             * @description held: a man of that kind stands there; own-man or enemy-man: another; free.
             * @enum {string}
             */
            readonly state: "held" | "own-man" | "enemy-man" | "free";
            /** @description Who stands on the square now; null for nobody. */
            readonly occupant: {
                /** @description Whose man it is. */
                readonly side: components["schemas"]["Side"];
                /** @description What it is. */
                readonly kind: components["schemas"]["Kind"];
            } | null;
            /** @description A man of that kind would not be lost there by exchange. */
            readonly safe: boolean;
            /** @description Men of that kind that can come safely within three moves, soonest first. */
            readonly users: readonly {
                /** @description Where the man stands. */
                readonly from: components["schemas"]["Square"];
                /** @description Its own moves to the post. */
                readonly moves: number;
            }[];
        };
        /** @description What the handbooks teach for one side. */
        readonly SheetSide: {
            /** @description Squares that the side wants in hand. */
            readonly keySquares: readonly components["schemas"]["Square"][];
            /** @description Usual posts by kind of man. */
            readonly posts: readonly components["schemas"]["SheetPost"][];
            /** @description The pawn levers of the side. */
            readonly levers: readonly components["schemas"]["SheetLever"][];
            /** @description Trades that the side looks for. */
            readonly wanted: readonly components["schemas"]["SheetTrade"][];
            /** @description Trades that the side keeps out of. */
            readonly unwanted: readonly components["schemas"]["SheetTrade"][];
            /** @description The typical plan of this side, in one sentence. */
            readonly plan: string;
        };
        /** @description What of the sheet holds for one side. */
        readonly SheetSideHeld: {
            /** @description Squares that the side wants in hand, and who holds them. */
            readonly keySquares: readonly components["schemas"]["SheetKeySquareHeld"][];
            /** @description Usual posts, and who can come. */
            readonly posts: readonly components["schemas"]["SheetPostHeld"][];
            /** @description Levers, and the pawn moves they need. */
            readonly levers: readonly components["schemas"]["SheetLeverHeld"][];
            /** @description Trades that the side looks for. */
            readonly wanted: readonly components["schemas"]["SheetTradeHeld"][];
            /** @description Trades that the side keeps out of. */
            readonly unwanted: readonly components["schemas"]["SheetTradeHeld"][];
            /** @description The typical plan of this side, in one sentence. */
            readonly plan: string;
        };
        /** @description The pawns of one side of a structure, as text. */
        readonly SheetSkeleton: {
            /** @description Pawns that must stand: "d4", "c2|c3" on either, "f" anywhere on the file. */
            readonly core: string;
            /** @description Files and squares without a pawn of this side. */
            readonly bare: string;
            /** @description Pawns that may be missing; each that is counts as a difference. */
            readonly usual: string;
        };
        /** @description A trade, own man for enemy man. */
        readonly SheetTrade: {
            /** @description The man of this side. */
            readonly own: components["schemas"]["SheetTradeMan"];
            /** @description The man of the other side. */
            readonly enemy: components["schemas"]["SheetTradeMan"];
        };
        /** @description A trade, and whether it can still come. */
        readonly SheetTradeHeld: {
            /** @description The man of this side. */
            readonly own: components["schemas"]["SheetTradeMan"];
            /** @description The man of the other side. */
            readonly enemy: components["schemas"]["SheetTradeMan"];
            /**
             * @description available: both such men are there; one-left; done: neither is.
             * @enum {string}
             */
            readonly state: "available" | "one-left" | "done";
            /** @description Such men of this side. */
            readonly ownMen: readonly components["schemas"]["Square"][];
            /** @description Such men of the other side. */
            readonly enemyMen: readonly components["schemas"]["Square"][];
        };
        /** @description A man that may be traded. */
        readonly SheetTradeMan: {
            /** @description The kind of man. */
            readonly kind: components["schemas"]["Kind"];
            /** @description Of which squares the bishop is, where that matters; else null. */
            readonly colour: components["schemas"]["Colour"] | null;
        };
        /**
         * @description A side.
         * @enum {string}
         */
        readonly Side: "white" | "black";
        /**
         * @description A square by its name, "a1" to "h8".
         * @enum {string}
         */
        readonly Square: "a1" | "b1" | "c1" | "d1" | "e1" | "f1" | "g1" | "h1" | "a2" | "b2" | "c2" | "d2" | "e2" | "f2" | "g2" | "h2" | "a3" | "b3" | "c3" | "d3" | "e3" | "f3" | "g3" | "h3" | "a4" | "b4" | "c4" | "d4" | "e4" | "f4" | "g4" | "h4" | "a5" | "b5" | "c5" | "d5" | "e5" | "f5" | "g5" | "h5" | "a6" | "b6" | "c6" | "d6" | "e6" | "f6" | "g6" | "h6" | "a7" | "b7" | "c7" | "d7" | "e7" | "f7" | "g7" | "h7" | "a8" | "b8" | "c8" | "d8" | "e8" | "f8" | "g8" | "h8";
        /** @description A square on which anything differs. */
        readonly SquareDifference: {
            readonly square: components["schemas"]["Square"];
            /** @description What stands there. */
            readonly occupant: {
                /** @description Before. */
                readonly a: {
                    readonly side: components["schemas"]["Side"];
                    readonly kind: components["schemas"]["Kind"];
                } | null;
                /** @description After. */
                readonly b: {
                    readonly side: components["schemas"]["Side"];
                    readonly kind: components["schemas"]["Kind"];
                } | null;
            };
            /** @description How many men of each side attack it. */
            readonly attackers: {
                readonly white: {
                    /** @description Before. */
                    readonly a: number;
                    /** @description After. */
                    readonly b: number;
                };
                readonly black: {
                    /** @description Before. */
                    readonly a: number;
                    /** @description After. */
                    readonly b: number;
                };
            };
            /** @description As in a reading. */
            readonly command: {
                /**
                 * @description Before.
                 * @enum {string}
                 */
                readonly a: "white" | "black" | "open" | "disputed";
                /**
                 * @description After.
                 * @enum {string}
                 */
                readonly b: "white" | "black" | "open" | "disputed";
            };
            /** @description Its hold as a weak square of a side. */
            readonly weakFor: {
                readonly white: {
                    /** @description Before. */
                    readonly a: ("permanent" | "fixed") | null;
                    /** @description After. */
                    readonly b: ("permanent" | "fixed") | null;
                };
                readonly black: {
                    /** @description Before. */
                    readonly a: ("permanent" | "fixed") | null;
                    /** @description After. */
                    readonly b: ("permanent" | "fixed") | null;
                };
            };
            /** @description Whether it is an outpost of a side. */
            readonly outpostFor: {
                readonly white: {
                    /** @description Before. */
                    readonly a: boolean;
                    /** @description After. */
                    readonly b: boolean;
                };
                readonly black: {
                    /** @description Before. */
                    readonly a: boolean;
                    /** @description After. */
                    readonly b: boolean;
                };
            };
        };
        /** @description One square: who attacks it and who commands it. */
        readonly SquareReading: {
            readonly square: components["schemas"]["Square"];
            readonly occupant: {
                readonly side: components["schemas"]["Side"];
                readonly kind: components["schemas"]["Kind"];
            } | null;
            /** @description Men that attack the square, cheapest first, pinned men included (FIDE Laws 3.1). */
            readonly attackers: {
                readonly white: readonly components["schemas"]["Square"][];
                readonly black: readonly components["schemas"]["Square"][];
            };
            /** @description Attackers that an absolute pin keeps from capturing here. */
            readonly held: {
                readonly white: readonly components["schemas"]["Square"][];
                readonly black: readonly components["schemas"]["Square"][];
            };
            /** @description Sliders that would join after a friendly man in front has captured here. */
            readonly behind: {
                readonly white: readonly components["schemas"]["Square"][];
                readonly black: readonly components["schemas"]["Square"][];
            };
            /**
             * @description Whose knight would be safe here: one side’s, both (open) or neither (disputed).
             * @enum {string}
             */
            readonly command: "white" | "black" | "open" | "disputed";
            /** @description Gain in pawns for the side that begins to capture here; null where it cannot. */
            readonly exchange: {
                readonly white: number | null;
                readonly black: number | null;
            };
        };
        /** @description One sentence of a reading. */
        readonly Statement: {
            /** @description Unique in the reading. */
            readonly key: string;
            /** @description The template. */
            readonly id: string;
            /** @enum {string} */
            readonly theme: "structure" | "squares" | "outposts" | "files" | "men" | "king" | "control";
            /** @description The side it speaks of; null for both. */
            readonly side: components["schemas"]["Side"] | null;
            /** @description Orders the statements; nothing else. */
            readonly weight: number;
            /** @description The claim alone: always the beginning of the text. */
            readonly head: string;
            /** @description The whole sentence or sentences. */
            readonly text: string;
            readonly squares: readonly components["schemas"]["Square"][];
            readonly men: readonly components["schemas"]["Square"][];
            /** @description What the text says, as data. */
            readonly facts: {
                readonly [key: string]: unknown;
            };
        };
        /** @description Handbook knowledge about one named pawn structure. */
        readonly StructureSheet: {
            /** @description Stable id of the structure. */
            readonly id: string;
            /** @description Its name in the books. */
            readonly name: string;
            /** @description The side with the leading part, in the colours as written here. */
            readonly leader: components["schemas"]["Side"];
            /** @description What the structure means, in a clause. */
            readonly lead: string;
            /** @description The pawns by which the structure is known. */
            readonly pawns: {
                readonly white: components["schemas"]["SheetSkeleton"];
                readonly black: components["schemas"]["SheetSkeleton"];
            };
            /** @description What White looks for. */
            readonly white: components["schemas"]["SheetSide"];
            /** @description What Black looks for. */
            readonly black: components["schemas"]["SheetSide"];
            /** @description Books that treat it. */
            readonly books: readonly components["schemas"]["SheetBook"][];
        };
        /** @description Every structure sheet. */
        readonly StructuresAnswer: {
            /** @description Version of the computations. */
            readonly engine: string;
            /** @description All sheets, by family of openings. */
            readonly structures: readonly components["schemas"]["StructureSheet"][];
        };
        /** @description A folder of positions, games and results on one subject. */
        readonly Study: {
            readonly id: components["schemas"]["Id"];
            readonly title: string;
            readonly summary: string;
            /** @description How many positions it has. */
            readonly positions: number;
            /** @description One more with each change; the ETag names it. */
            readonly version: number;
            readonly createdAt: components["schemas"]["Moment"];
            readonly updatedAt: components["schemas"]["Moment"];
            /** @description Set: in the trash. */
            readonly deletedAt: components["schemas"]["Moment"] | null;
        };
        /** @description The fields that change; the others stay. */
        readonly StudyChange: {
            readonly title?: string;
            readonly summary?: string;
        };
        /** @description Something to be computed and kept. */
        readonly StudyComparisonRequest: {
            /** @default  */
            readonly title?: string;
            /**
             * @description Markdown.
             * @default
             */
            readonly note?: string;
            /** @description The request of the computing call; its answer is kept. */
            readonly request: components["schemas"]["ComparisonRequest"];
        };
        /** @description Something to be computed and kept. */
        readonly StudyExchangeRequest: {
            /** @default  */
            readonly title?: string;
            /**
             * @description Markdown.
             * @default
             */
            readonly note?: string;
            /** @description The request of the computing call; its answer is kept. */
            readonly request: components["schemas"]["ExchangesRequest"];
        };
        /** @description Everything in a study; games as PGN. */
        readonly StudyExport: {
            readonly study: components["schemas"]["Study"];
            readonly positions: readonly components["schemas"]["StudyPosition"][];
            readonly results: readonly components["schemas"]["StudyResult"][];
            readonly games: readonly string[];
        };
        /** @description A page of a list. */
        readonly StudyPage: {
            readonly items: readonly components["schemas"]["Study"][];
            /** @description The cursor of the next page; null at the end. */
            readonly next: string | null;
        };
        /** @description A position in a study. */
        readonly StudyPosition: {
            readonly id: components["schemas"]["Id"];
            readonly fen: string;
            readonly title: string;
            readonly note: string;
            readonly marks: readonly components["schemas"]["Mark"][];
            /** @description The layer its plate shows; null: the reader’s choice. */
            readonly layer: ("position" | "control" | "command" | "weak" | "outposts" | "files" | "mobility" | "routes") | null;
            readonly man: components["schemas"]["Square"] | null;
            /** @description One more with each change; the ETag names it. */
            readonly version: number;
            readonly createdAt: components["schemas"]["Moment"];
            readonly updatedAt: components["schemas"]["Moment"];
        };
        /** @description A study to be made. */
        readonly StudyRequest: {
            readonly title: string;
            /** @default  */
            readonly summary?: string;
        };
        /** @description A comparison, route or exchange test kept in a study. */
        readonly StudyResult: {
            readonly id: components["schemas"]["Id"];
            /** @enum {string} */
            readonly kind: "comparison" | "route" | "exchange";
            readonly title: string;
            readonly note: string;
            /** @description As it was sent. */
            readonly request: unknown;
            /** @description As it was answered. */
            readonly result: unknown;
            /** @description The version that computed it. */
            readonly engine: string;
            /** @description Whether that is the present version. */
            readonly current: boolean;
            /** @description One more with each change; the ETag names it. */
            readonly version: number;
            readonly computedAt: components["schemas"]["Moment"];
            readonly createdAt: components["schemas"]["Moment"];
            readonly updatedAt: components["schemas"]["Moment"];
        };
        /** @description All results of a kind. */
        readonly StudyResults: {
            readonly items: readonly components["schemas"]["StudyResult"][];
        };
        /** @description Something to be computed and kept. */
        readonly StudyRouteRequest: {
            /** @default  */
            readonly title?: string;
            /**
             * @description Markdown.
             * @default
             */
            readonly note?: string;
            /** @description The request of the computing call; its answer is kept. */
            readonly request: components["schemas"]["RoutesRequest"];
        };
        /** @description A compact reading of one position of a game. */
        readonly TimelinePly: {
            /** @description Half-moves played. */
            readonly ply: number;
            /** @description The move that led here; null at the beginning. */
            readonly move: string | null;
            /** @description The position, six fields. */
            readonly fen: string;
            /** @description The named pawn structure; its side leads, or is to move where the structure is alike for both. */
            readonly structure: {
                readonly id: string;
                readonly name: string;
                readonly side: components["schemas"]["Side"];
            } | null;
            /** @description Squares commanded: c3 to f6; files a to c; files f to h; ranks 1 to 3; ranks 6 to 8. */
            readonly command: {
                readonly centre: {
                    readonly white: number;
                    readonly black: number;
                };
                readonly queenside: {
                    readonly white: number;
                    readonly black: number;
                };
                readonly kingside: {
                    readonly white: number;
                    readonly black: number;
                };
                readonly whiteCamp: {
                    readonly white: number;
                    readonly black: number;
                };
                readonly blackCamp: {
                    readonly white: number;
                    readonly black: number;
                };
            };
            readonly white: {
                /** @description Weak squares of the side itself. */
                readonly weakSquares: number;
                /** @description Outposts of the side: no enemy pawn can come, a pawn guards them now or in one move. */
                readonly outposts: number;
                /** @description Files it controls. */
                readonly files: number;
                /** @description Safe moves of all its men. */
                readonly safeMoves: number;
                /** @description Flight squares of its king. */
                readonly flights: number;
                /** @description Own pawns before its king: on its file and the files beside, one a file at most. */
                readonly shelter: number;
                /** @description Enemy men that attack the zone of its king. */
                readonly kingAttackers: number;
                /** @description Worth of its men in pawns, the king left out. */
                readonly material: number;
            };
            readonly black: {
                /** @description Weak squares of the side itself. */
                readonly weakSquares: number;
                /** @description Outposts of the side: no enemy pawn can come, a pawn guards them now or in one move. */
                readonly outposts: number;
                /** @description Files it controls. */
                readonly files: number;
                /** @description Safe moves of all its men. */
                readonly safeMoves: number;
                /** @description Flight squares of its king. */
                readonly flights: number;
                /** @description Own pawns before its king: on its file and the files beside, one a file at most. */
                readonly shelter: number;
                /** @description Enemy men that attack the zone of its king. */
                readonly kingAttackers: number;
                /** @description Worth of its men in pawns, the king left out. */
                readonly material: number;
            };
        };
        /** @description Counts of one side over the whole board. */
        readonly Totals: {
            readonly controlled: number;
            readonly commanded: number;
            readonly enemyHalf: number;
            readonly centre: number;
            readonly extendedCentre: number;
            readonly safeMoves: number;
        };
        /** @description How often each key made each call, day by day (UTC). */
        readonly Usage: {
            /** Format: date */
            readonly since: string;
            readonly items: readonly {
                readonly key: components["schemas"]["Id"];
                readonly name: string;
                /** Format: date */
                readonly day: string;
                readonly call: string;
                readonly count: number;
            }[];
        };
        /** @description A square that its side’s pawns cannot guard. */
        readonly WeakSquare: {
            readonly square: components["schemas"]["Square"];
            /** @description The side whose weakness it is. */
            readonly side: components["schemas"]["Side"];
            /** @enum {string} */
            readonly hold: "permanent" | "fixed";
            readonly matters: boolean;
            readonly commandedByEnemy: boolean;
            /** @description Enemy men that can come to stand there safely, soonest first. */
            readonly users: readonly {
                /** @description Where the man stands now. */
                readonly from: components["schemas"]["Square"];
                readonly kind: components["schemas"]["Kind"];
                /** @description Own moves needed to stand there safely, the enemy standing still; 0: it stands there. */
                readonly moves: number;
            }[];
            /** @description The colour of the square. */
            readonly complex: components["schemas"]["Colour"];
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
    readonly getReading: {
        readonly parameters: {
            readonly query: {
                /**
                 * @description A position in Forsyth-Edwards notation, with six fields or, as in EPD, four.
                 * @example r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11
                 */
                readonly fen: components["schemas"]["Fen"];
                readonly mode?: components["schemas"]["Mode"];
                /**
                 * @example [
                 *       "statements",
                 *       "lead"
                 *     ]
                 */
                readonly include?: readonly components["schemas"]["ReadingPart"][];
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read a position, cacheable */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Reading"] | components["schemas"]["ReadingParts"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createReading: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 4096 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *       "include": [
                 *         "statements",
                 *         "lead"
                 *       ]
                 *     }
                 */
                readonly "application/json": components["schemas"]["ReadingRequest"];
            };
        };
        readonly responses: {
            /** @description Read a position */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Reading"] | components["schemas"]["ReadingParts"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createReadings: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 262144 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "fens": [
                 *         "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *         "8/5ppp/4k3/3p4/3P1K2/4P3/5PPP/8 w - - 0 1",
                 *         "not a position"
                 *       ],
                 *       "include": [
                 *         "lead"
                 *       ]
                 *     }
                 */
                readonly "application/json": components["schemas"]["BatchRequest"];
            };
        };
        readonly responses: {
            /** @description One JSON value a line; the schema is that of a line. */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/x-ndjson": components["schemas"]["Reading"] | components["schemas"]["BadLine"] | components["schemas"]["ReadingParts"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createRoutes: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 4096 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *       "man": "f3",
                 *       "choicesMax": 3
                 *     }
                 */
                readonly "application/json": components["schemas"]["RoutesRequest"];
            };
        };
        readonly responses: {
            /** @description Find posts and routes */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["RoutesAnswer"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createRouteCheck: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 4096 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *       "route": [
                 *         "f3",
                 *         "d2",
                 *         "b3"
                 *       ]
                 *     }
                 */
                readonly "application/json": components["schemas"]["RouteCheckRequest"];
            };
        };
        readonly responses: {
            /** @description Check a route */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["RouteCheck"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createComparison: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 8192 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "subjects": [
                 *         {
                 *           "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11"
                 *         },
                 *         {
                 *           "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *           "place": {
                 *             "from": "f3",
                 *             "to": "e5"
                 *           },
                 *           "label": "Knight on e5"
                 *         }
                 *       ]
                 *     }
                 */
                readonly "application/json": components["schemas"]["ComparisonRequest"];
            };
        };
        readonly responses: {
            /** @description Compare positions or placements */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Comparison"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createExchanges: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 4096 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11"
                 *     }
                 */
                readonly "application/json": components["schemas"]["ExchangesRequest"];
            };
        };
        readonly responses: {
            /** @description Test the trades */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ExchangeTest"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createGames: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 400000 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "pgn": "1. d4 d5 2. c4 e6 3. Nc3 Nf6 4. cxd5 exd5 5. Bg5 Be7 6. e3 O-O 7. Bd3 Nbd7 8. Qc2 c6 *"
                 *     }
                 */
                readonly "application/json": components["schemas"]["GamesRequest"];
            };
        };
        readonly responses: {
            /** @description Read games */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["GamesAnswer"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. pgn-refused: The text holds no game that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listStructures: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List the structure sheets */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StructuresAnswer"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getStructure: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @example carlsbad */
                readonly id: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read a structure sheet */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StructureSheet"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getSheet: {
        readonly parameters: {
            readonly query: {
                /**
                 * @description A position in Forsyth-Edwards notation, with six fields or, as in EPD, four.
                 * @example r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11
                 */
                readonly fen: components["schemas"]["Fen"];
                readonly mode?: components["schemas"]["Mode"];
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Hold a structure sheet against a position */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["SheetAnswer"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getPlateSvg: {
        readonly parameters: {
            readonly query: {
                /**
                 * @description A position in Forsyth-Edwards notation, with six fields or, as in EPD, four.
                 * @example r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11
                 */
                readonly fen: components["schemas"]["Fen"];
                readonly mode?: components["schemas"]["Mode"];
                /**
                 * @description What is drawn over the board.
                 * @example command
                 */
                readonly layer?: "position" | "control" | "command" | "weak" | "outposts" | "files" | "mobility" | "routes";
                /** @description Width of the whole figure in pixels. */
                readonly width?: number;
                readonly theme?: "light" | "dark" | "print";
                /** @description The side at the foot of the board. */
                readonly side?: components["schemas"]["Side"];
                /** @description For the layers "mobility" and "routes": the square of the man. Routes without one show the way that helps the side to move most. */
                readonly man?: components["schemas"]["Square"];
                /** @description For the layer "routes": where the man is to stand. Left out: the post that helps most. */
                readonly post?: components["schemas"]["Square"];
                /** @description A line of text under the board, instead of the one from the reading. */
                readonly caption?: string;
                /** @description The leading statements: in the margin where there is room, as numbers with a list below, or not at all. */
                readonly notes?: "margin" | "numbers" | "none";
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Draw a plate as SVG */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "image/svg+xml": string;
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getPlatePng: {
        readonly parameters: {
            readonly query: {
                /**
                 * @description A position in Forsyth-Edwards notation, with six fields or, as in EPD, four.
                 * @example r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11
                 */
                readonly fen: components["schemas"]["Fen"];
                readonly mode?: components["schemas"]["Mode"];
                /**
                 * @description What is drawn over the board.
                 * @example command
                 */
                readonly layer?: "position" | "control" | "command" | "weak" | "outposts" | "files" | "mobility" | "routes";
                /**
                 * @description Width of the whole figure in pixels.
                 * @example 480
                 */
                readonly width?: number;
                readonly theme?: "light" | "dark" | "print";
                /** @description The side at the foot of the board. */
                readonly side?: components["schemas"]["Side"];
                /** @description For the layers "mobility" and "routes": the square of the man. Routes without one show the way that helps the side to move most. */
                readonly man?: components["schemas"]["Square"];
                /** @description For the layer "routes": where the man is to stand. Left out: the post that helps most. */
                readonly post?: components["schemas"]["Square"];
                /** @description A line of text under the board, instead of the one from the reading. */
                readonly caption?: string;
                /** @description The leading statements: in the margin where there is room, as numbers with a list below, or not at all. */
                readonly notes?: "margin" | "numbers" | "none";
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Draw a plate as PNG */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "image/png": string;
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listStudies: {
        readonly parameters: {
            readonly query?: {
                /**
                 * @description Most items of the page.
                 * @example 10
                 */
                readonly limit?: number;
                /** @description The "next" of the page before. */
                readonly cursor?: string;
                /** @description true: those in the trash, from where they can be restored. */
                readonly trash?: "true" | "false";
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List studies */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description rel="next": the next page (RFC 8288). */
                    readonly Link?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyPage"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createStudy: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description A text of your own; the same request sent again with it stores nothing twice and answers the same for a day. */
                readonly "Idempotency-Key"?: string;
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 16384 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "title": "Knights against bad bishops",
                 *       "summary": "Four positions, one idea."
                 *     }
                 */
                readonly "application/json": components["schemas"]["StudyRequest"];
            };
        };
        readonly responses: {
            /** @description Make a study */
            readonly 201: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Study"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description idempotency-busy: The first request with this Idempotency-Key is still at work. */
            readonly 409: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. idempotency-mismatch: This Idempotency-Key was used with another request. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getStudy: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Study"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly deleteStudy: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Put a study into the trash */
            readonly 204: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly changeStudy: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 16384 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "summary": "Four positions, one idea: the bishop goes first."
                 *     }
                 */
                readonly "application/json": components["schemas"]["StudyChange"];
            };
        };
        readonly responses: {
            /** @description Change a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Study"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly restoreStudy: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Take a study out of the trash */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Study"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listChanges: {
        readonly parameters: {
            readonly query?: {
                /**
                 * @description Most items of the page.
                 * @example 10
                 */
                readonly limit?: number;
                /** @description The "next" of the page before. */
                readonly cursor?: string;
            };
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read the history of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description rel="next": the next page (RFC 8288). */
                    readonly Link?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ChangePage"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getShares: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description See with whom a study is shared */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Shares"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly putShares: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 32768 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "students": []
                 *     }
                 */
                readonly "application/json": components["schemas"]["Shares"];
            };
        };
        readonly responses: {
            /** @description Share a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Shares"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly exportStudyPgn: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Export a study as PGN */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/vnd.chess-pgn": string;
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly exportStudyCsv: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Export the positions of a study as CSV */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "text/csv": string;
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly exportStudyJson: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Export a study as JSON */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyExport"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listPositions: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List the positions of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["PositionList"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createPosition: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description A text of your own; the same request sent again with it stores nothing twice and answers the same for a day. */
                readonly "Idempotency-Key"?: string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 131072 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *       "title": "Before the minority attack",
                 *       "note": "Where does the a1 rook belong?"
                 *     }
                 */
                readonly "application/json": components["schemas"]["PositionRequest"];
            };
        };
        readonly responses: {
            /** @description Keep a position in a study */
            readonly 201: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyPosition"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description idempotency-busy: The first request with this Idempotency-Key is still at work. conflict: What is there already does not go with the request. */
            readonly 409: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. idempotency-mismatch: This Idempotency-Key was used with another request. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getPosition: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000b1
                 */
                readonly positionId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read a position of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyPosition"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly deletePosition: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000b1
                 */
                readonly positionId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Put a position into the trash */
            readonly 204: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly changePosition: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000b1
                 */
                readonly positionId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 131072 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "note": "It belongs on b1, behind the lever b4-b5."
                 *     }
                 */
                readonly "application/json": components["schemas"]["PositionChange"];
            };
        };
        readonly responses: {
            /** @description Change a position of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyPosition"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly restorePosition: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000b1
                 */
                readonly positionId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 1024 bytes. */
        readonly requestBody: {
            readonly content: {
                /** @example {} */
                readonly "application/json": components["schemas"]["RestoreRequest"];
            };
        };
        readonly responses: {
            /** @description Restore a position */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyPosition"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listStudyRoutes: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List the routes of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResults"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createStudyRoute: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description A text of your own; the same request sent again with it stores nothing twice and answers the same for a day. */
                readonly "Idempotency-Key"?: string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 131072 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "title": "First try",
                 *       "request": {
                 *         "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *         "man": "f3",
                 *         "choicesMax": 2
                 *       }
                 *     }
                 */
                readonly "application/json": components["schemas"]["StudyRouteRequest"];
            };
        };
        readonly responses: {
            /** @description Compute a route and keep it */
            readonly 201: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description idempotency-busy: The first request with this Idempotency-Key is still at work. */
            readonly 409: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. idempotency-mismatch: This Idempotency-Key was used with another request. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getStudyRoute: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d2
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read a route of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly deleteStudyRoute: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d2
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Put a route into the trash */
            readonly 204: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly changeStudyRoute: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d2
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 131072 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "note": "Black is slower by one move."
                 *     }
                 */
                readonly "application/json": components["schemas"]["ResultChange"];
            };
        };
        readonly responses: {
            /** @description Change the words of a route */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly restoreStudyRoute: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d2
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Take a route out of the trash */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listStudyComparisons: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List the comparisons of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResults"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createStudyComparison: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description A text of your own; the same request sent again with it stores nothing twice and answers the same for a day. */
                readonly "Idempotency-Key"?: string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 131072 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "title": "First try",
                 *       "request": {
                 *         "subjects": [
                 *           {
                 *             "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11"
                 *           },
                 *           {
                 *             "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *             "place": {
                 *               "from": "f3",
                 *               "to": "e5"
                 *             }
                 *           }
                 *         ]
                 *       }
                 *     }
                 */
                readonly "application/json": components["schemas"]["StudyComparisonRequest"];
            };
        };
        readonly responses: {
            /** @description Compute a comparison and keep it */
            readonly 201: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description idempotency-busy: The first request with this Idempotency-Key is still at work. */
            readonly 409: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. idempotency-mismatch: This Idempotency-Key was used with another request. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getStudyComparison: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d1
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read a comparison of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly deleteStudyComparison: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d1
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Put a comparison into the trash */
            readonly 204: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly changeStudyComparison: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d1
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 131072 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "note": "Black is slower by one move."
                 *     }
                 */
                readonly "application/json": components["schemas"]["ResultChange"];
            };
        };
        readonly responses: {
            /** @description Change the words of a comparison */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly restoreStudyComparison: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d1
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Take a comparison out of the trash */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listStudyExchanges: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List the exchange tests of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResults"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createStudyExchange: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description A text of your own; the same request sent again with it stores nothing twice and answers the same for a day. */
                readonly "Idempotency-Key"?: string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 131072 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "title": "First try",
                 *       "request": {
                 *         "fen": "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11"
                 *       }
                 *     }
                 */
                readonly "application/json": components["schemas"]["StudyExchangeRequest"];
            };
        };
        readonly responses: {
            /** @description Compute a exchange test and keep it */
            readonly 201: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description idempotency-busy: The first request with this Idempotency-Key is still at work. */
            readonly 409: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. idempotency-mismatch: This Idempotency-Key was used with another request. fen-refused: The FEN is not a position that can be read. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getStudyExchange: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d3
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read a exchange test of a study */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly deleteStudyExchange: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d3
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Put a exchange test into the trash */
            readonly 204: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly changeStudyExchange: {
        readonly parameters: {
            readonly query?: never;
            readonly header: {
                /** @description The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed. */
                readonly "If-Match": string;
            };
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d3
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        /** @description At most 131072 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "note": "Black is slower by one move."
                 *     }
                 */
                readonly "application/json": components["schemas"]["ResultChange"];
            };
        };
        readonly responses: {
            /** @description Change the words of a exchange test */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-lost: Somebody else has changed this first. */
            readonly 412: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description version-needed: This call needs to know which version it changes. */
            readonly 428: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly restoreStudyExchange: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000a1
                 */
                readonly id: components["schemas"]["Id"];
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000d3
                 */
                readonly resultId: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Take a exchange test out of the trash */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["StudyResult"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listJobs: {
        readonly parameters: {
            readonly query?: {
                /**
                 * @description Most items of the page.
                 * @example 10
                 */
                readonly limit?: number;
                /** @description The "next" of the page before. */
                readonly cursor?: string;
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List jobs */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description rel="next": the next page (RFC 8288). */
                    readonly Link?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["JobPage"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createJob: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: {
                /** @description A text of your own; the same request sent again with it stores nothing twice and answers the same for a day. */
                readonly "Idempotency-Key"?: string;
            };
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 16000000 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "kind": "readings",
                 *       "fens": [
                 *         "r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11",
                 *         "8/5ppp/4k3/3p4/3P1K2/4P3/5PPP/8 w - - 0 1"
                 *       ]
                 *     }
                 */
                readonly "application/json": components["schemas"]["JobRequest"];
            };
        };
        readonly responses: {
            /** @description Begin long work */
            readonly 202: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Names this version. */
                    readonly ETag?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Job"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description idempotency-busy: The first request with this Idempotency-Key is still at work. */
            readonly 409: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. idempotency-mismatch: This Idempotency-Key was used with another request. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getJob: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000f1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description See how far a job is */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Job"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly cancelJob: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000f1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Cancel a job */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Job"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly watchJob: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000f1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Server-sent events; the schema is that of the data of an event. */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "text/event-stream": components["schemas"]["Job"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listJobItems: {
        readonly parameters: {
            readonly query?: {
                /** @example 10 */
                readonly limit?: number;
                /** @description The number behind which the page begins. */
                readonly after?: number;
            };
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000f1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Read what became of the items */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["JobItems"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly retryJob: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000f1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Try a job again */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Job"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description conflict: What is there already does not go with the request. */
            readonly 409: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly listKeys: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List the keys */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["KeyList"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly createKey: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        /** @description At most 4096 bytes. */
        readonly requestBody: {
            readonly content: {
                /**
                 * @example {
                 *       "name": "The magazine’s figures",
                 *       "scopes": [
                 *         "compute"
                 *       ],
                 *       "days": 30
                 *     }
                 */
                readonly "application/json": components["schemas"]["KeyRequest"];
            };
        };
        readonly responses: {
            /** @description Make a key */
            readonly 201: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["NewKey"];
                };
            };
            /** @description not-json: The body is not JSON. */
            readonly 400: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description body-too-large: The body is larger than this call takes. */
            readonly 413: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description unsupported-media-type: The body is of a type that this call does not take. */
            readonly 415: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly revokeKey: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /**
                 * @description An id of something stored.
                 * @example 00000000-0000-4000-8000-0000000000c1
                 */
                readonly id: components["schemas"]["Id"];
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description End a key */
            readonly 204: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getUsage: {
        readonly parameters: {
            readonly query?: {
                /**
                 * @description How many days back.
                 * @example 7
                 */
                readonly days?: number;
            };
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description See what the keys have used */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description What is left of the allowance, and for how many seconds. */
                    readonly RateLimit?: string;
                    /** @description The allowance: so many requests in so many seconds. */
                    readonly "RateLimit-Policy"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Usage"];
                };
            };
            /** @description not-signed-in: This call needs a key that is good, or a person who is signed in. */
            readonly 401: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description not-allowed: The key’s scopes, or the person’s role, do not allow this call. */
            readonly 403: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description too-many-requests: The allowance is used up for now. */
            readonly 429: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getIndex: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description List the calls */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": {
                        /** @description Version of the computations. */
                        readonly engine: string;
                        readonly document: string;
                        readonly calls: readonly components["schemas"]["Link"][];
                    };
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getDocument: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description The OpenAPI document */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": {
                        readonly openapi: string;
                        readonly info: {
                            readonly title: string;
                            readonly version: string;
                        } & {
                            readonly [key: string]: unknown;
                        };
                    } & {
                        readonly [key: string]: unknown;
                    };
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getProblem: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path: {
                /** @example fen-refused */
                readonly code: string;
            };
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Explain a problem */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["ProblemKind"];
                };
            };
            /** @description The copy named by If-None-Match is still good. */
            readonly 304: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    /** @description Changes only when the answer does. */
                    readonly ETag?: string;
                    readonly [name: string]: unknown;
                };
                content?: never;
            };
            /** @description not-found: There is nothing at this address. */
            readonly 404: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description invalid-request: The request does not have the promised shape. */
            readonly 422: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
    readonly getHealth: {
        readonly parameters: {
            readonly query?: never;
            readonly header?: never;
            readonly path?: never;
            readonly cookie?: never;
        };
        readonly requestBody?: never;
        readonly responses: {
            /** @description Live and ready */
            readonly 200: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/json": components["schemas"]["Health"];
                };
            };
            /** @description internal: Something went wrong on our side. */
            readonly 500: {
                headers: {
                    /** @description The id of this request. */
                    readonly "X-Request-Id"?: string;
                    readonly [name: string]: unknown;
                };
                content: {
                    readonly "application/problem+json": components["schemas"]["Problem"];
                };
            };
        };
    };
}
