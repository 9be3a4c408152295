export interface paths {
    "/api/health": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Whether the server works, and which one it is */
        get: operations["health"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/people": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Everybody active, with name and roles; for administrators everybody, with all they look after */
        get: operations["listPeople"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/people/{id}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        /** Change a person's name or roles */
        patch: operations["changePerson"];
        trace?: never;
    };
    "/api/people/{id}/deactivation": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Shut a person out at once; nothing is deleted */
        post: operations["deactivatePerson"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/people/{id}/reactivation": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Let a person in again */
        post: operations["reactivatePerson"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/journal": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Entries of the journal, the latest first */
        get: operations["listJournal"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/journal/verification": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Recompute the whole journal and name the first fault */
        post: operations["verifyJournal"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/journal/checkpoints": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Signed heads of the journal, to be kept elsewhere */
        get: operations["listCheckpoints"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/mail/outbox": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The latest letters and what became of them */
        get: operations["listOutbox"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/session": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Who is signed in */
        get: operations["currentSession"];
        put?: never;
        /** Sign in; the session is kept in a cookie */
        post: operations["signIn"];
        /** Sign out */
        delete: operations["signOut"];
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/session/demo-people": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The invented people of a demo office */
        get: operations["listDemoPeople"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/session/sessions": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The caller's own sessions */
        get: operations["listSessions"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/session/sessions/{id}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post?: never;
        /** End another of the caller's sessions */
        delete: operations["endSession"];
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/session/password": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        /** Change the own password; all other sessions end */
        put: operations["changePassword"];
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/settings": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** What the office has decided on */
        get: operations["getSettings"];
        /** Change what the office has decided on */
        put: operations["changeSettings"];
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/people/invitations": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Invite somebody by mail; asked again, the former link is void */
        post: operations["invitePerson"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/invitations/{token}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Whom an invitation is for */
        get: operations["getInvitation"];
        put?: never;
        /** Join with a password; the link is used up */
        post: operations["acceptInvitation"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/password-resets": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Ask for a link to choose a new password */
        post: operations["askForPassword"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/password-resets/{token}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Choose a new password; the link is used up and all sessions end */
        post: operations["resetPassword"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/notices": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The caller's own notices */
        get: operations["listNotices"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/notices/preferences": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Which notices come by mail, too */
        get: operations["getNoticePreferences"];
        /** Choose which notices come by mail */
        put: operations["setNoticePreferences"];
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/notices/{id}/reading": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Say that a notice was read */
        post: operations["readNotice"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/appointments": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Who was appointed technical authority, and how */
        get: operations["listAppointments"];
        put?: never;
        /** Propose a technical authority */
        post: operations["proposeAppointment"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/appointments/{id}/confirmation": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Confirm a proposal, as another technical authority or as the office's principal */
        post: operations["confirmAppointment"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/appointments/{id}/end": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** End an appointment, or take a proposal back */
        post: operations["endAppointment"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/geometries": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** What correlations were measured on */
        get: operations["listGeometries"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/property-equations": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Published equations for fluid properties */
        get: operations["listPropertyEquations"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/property-equations/{slug}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** One of them, with its worked checks */
        get: operations["getPropertyEquation"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/differences": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** What changed between two revisions, field by field */
        get: operations["compareRevisions"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The register, searched and filtered */
        get: operations["listCorrelations"];
        put?: never;
        /** A new correlation as a draft */
        post: operations["createCorrelation"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The sheet: the approved revision, else the latest that the caller may see */
        get: operations["getCorrelation"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** A draft of the next revision */
        post: operations["createRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The sheet of one revision */
        get: operations["getRevision"];
        /** Puts other content into a draft, or into one in review */
        put: operations["editRevision"];
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/submission": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Puts a draft into review, once the machine check passes */
        post: operations["submitRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/iterations": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Says that a revision in review is ready again, after changes or answers */
        post: operations["putRevisionForward"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/assignments": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Takes a review from the desk */
        post: operations["takeReview"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/reviews": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** A reviewer's verdict on the present content */
        post: operations["reviewRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/approval": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** An authority's signature on the present content, with the password once more */
        post: operations["approveRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/decline": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** An authority's no to a revision in review */
        post: operations["declineRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/suspension": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Takes a revision out of use while a problem is looked into */
        post: operations["suspendRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/reinstatement": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Puts a suspended revision back into use */
        post: operations["reinstateRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/withdrawal": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Takes a revision out of use for good */
        post: operations["withdrawRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/comments": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** A remark on one field, or on the whole */
        post: operations["commentOnRevision"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/comments/{id}/answers": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** What is to be said to a comment */
        post: operations["answerComment"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/comments/{id}/resolution": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Settles a comment: by whoever made it, or by the originator once it has an answer */
        post: operations["resolveComment"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/review": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The review of a revision: report, reviewers, verdicts, comments, iterations */
        get: operations["getReview"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/problem-reports": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** What was found wrong with a correlation */
        get: operations["listProblemReports"];
        put?: never;
        /** Reports a problem with a revision */
        post: operations["fileProblemReport"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/problem-reports/{id}/answer": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Says what was found, and closes the report */
        post: operations["answerProblemReport"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/attachments": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** Documents attached to the sources of a revision */
        get: operations["listAttachments"];
        put?: never;
        /** Attaches a PDF, PNG or JPEG of at most 15 MB to a source */
        post: operations["addAttachment"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/attachments/{id}/file": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The document, always as a file to save */
        get: operations["downloadAttachment"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/attachments/{id}/licence": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Says anew whether a document may leave the office */
        post: operations["setAttachmentLicence"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/candidates": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Every sheet of a geometry held against one duty */
        post: operations["findCandidates"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/citations/reading": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Reads BibTeX, RIS or CSL-JSON into citation items; keeps nothing */
        post: operations["readCitations"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/citations": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The sources of a revision as a file */
        get: operations["exportCitations"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/desk": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** What waits for the caller, by role */
        get: operations["getDesk"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/evaluations": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** A coefficient for a duty, with every step */
        post: operations["evaluateCorrelation"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/evaluations/{id}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** A kept evaluation, with what was asked */
        get: operations["getEvaluation"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/schemas/sheet.json": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The JSON Schema of a sheet as a file */
        get: operations["getSheetSchema"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/correlations/{slug}/revisions/{number}/sheet.json": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** A revision as a file */
        get: operations["downloadSheet"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/exchange/sheets": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Brings a sheet in as a draft: the file, or its JSON as the body */
        post: operations["uploadSheet"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/exchange/register.json": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        /** The whole register with every iteration, standing, verdict, comment and signature, and its journals */
        get: operations["exportRegister"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/exchange/register": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        /** Brings a whole register in, where there is none yet */
        post: operations["importRegister"];
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
        HealthResponse: {
            /** @enum {string} */
            status: "ok";
            version: string;
            revision: string;
            /** @description Whether office and people are invented */
            demo: boolean;
        };
        PersonEntry: {
            id: string;
            name: string;
            roles: ("engineer" | "reviewer" | "authority" | "auditor" | "administrator")[];
            /** @description Only for administrators */
            email?: string;
            /** @description Only for administrators */
            active?: boolean;
            /** @description Only for administrators: was invited and has not joined yet */
            invited?: boolean;
            /**
             * Format: date-time
             * @description Only for administrators
             */
            lastSignIn?: string | null;
        };
        PeopleResponse: {
            items: components["schemas"]["PersonEntry"][];
        };
        PersonChangeDto: {
            name?: string;
            roles?: ("engineer" | "reviewer" | "authority" | "auditor" | "administrator")[];
        };
        ManagedPerson: {
            id: string;
            name: string;
            email: string;
            roles: ("engineer" | "reviewer" | "authority" | "auditor" | "administrator")[];
            active: boolean;
            /** @description Was invited and has not joined yet */
            invited: boolean;
            /** Format: date-time */
            lastSignIn: string | null;
        };
        ReasonDto: {
            reason: string;
        };
        JournalActor: {
            id: string;
            name: string;
        };
        JournalItem: {
            index: number;
            /** Format: date-time */
            at: string;
            actor: components["schemas"]["JournalActor"];
            /** @enum {string} */
            act: "office.founded" | "office.first-link" | "settings.changed" | "person.added" | "person.invited" | "person.joined" | "person.changed" | "person.deactivated" | "person.reactivated" | "password.changed" | "password-reset.asked" | "password-reset.done" | "session.closed" | "appointment.proposed" | "appointment.confirmed" | "appointment.ended" | "appointment.lapsed" | "notice.read" | "notices.chosen" | "session.started" | "session.refused" | "session.ended" | "correlation.drafted" | "revision.drafted" | "revision.submitted" | "revision.taken-back" | "revision.edited" | "revision.put-forward" | "revision.review-due" | "review.taken" | "comment.answered" | "comment.resolved" | "revision.taken-over" | "revision.commented" | "revision.reviewed" | "revision.approved" | "revision.superseded" | "revision.declined" | "revision.suspended" | "revision.reinstated" | "revision.withdrawn" | "problem-report.filed" | "problem-report.answered" | "register.imported" | "evaluation.deviated" | "property-equation.drafted" | "attachment.added" | "attachment.relicensed" | "geometries.added";
            /** @description Path of what was acted on */
            subject: string;
            detail: {
                [key: string]: unknown;
            };
            /** @description RFC 9162 leaf hash of the entry as it is stored, hex */
            leaf: string;
        };
        JournalResponse: {
            /** @description The latest first */
            items: components["schemas"]["JournalItem"][];
            nextCursor: string | null;
            /** @description Number of entries */
            size: number;
            /** @description Root hash of the tree over all of them, hex; null when stored hashes are gone */
            root: string | null;
        };
        FaultResponse: {
            index: number;
            /** @enum {string} */
            kind: "altered" | "missing" | "inserted" | "tree" | "checkpoint";
            message: string;
        };
        VerificationResponse: {
            ok: boolean;
            /** @description Entries found right, up to the first fault */
            entries: number;
            firstFault?: components["schemas"]["FaultResponse"];
        };
        CheckpointItem: {
            size: number;
            root: string;
            /** Format: date-time */
            at: string;
            keyId: string;
            /** @description Ed25519 over the text, base64 */
            signature: string;
            /** @description What was signed */
            text: string;
        };
        PublicKeyItem: {
            keyId: string;
            pem: string;
        };
        CheckpointsResponse: {
            /** @description The latest first */
            items: components["schemas"]["CheckpointItem"][];
            publicKeys: components["schemas"]["PublicKeyItem"][];
        };
        OutboxItem: {
            id: string;
            to: string;
            subject: string;
            /** @description A link that lets somebody in is shown only where there is no mail server to send it */
            body: string;
            /** Format: date-time */
            at: string;
            /**
             * @description local: there is no mail server, it is read here
             * @enum {string}
             */
            state: "local" | "waiting" | "sent" | "failed";
            tries: number;
            lastError: string | null;
        };
        OutboxResponse: {
            /** @description The latest first */
            items: components["schemas"]["OutboxItem"][];
        };
        SignInDto: {
            /** @example engineer@merestone.example */
            email: string;
            /** Format: password */
            password: string;
        };
        SignedInPerson: {
            id: string;
            name: string;
            email: string;
            roles: ("engineer" | "reviewer" | "authority" | "auditor" | "administrator")[];
        };
        SessionResponse: {
            person: components["schemas"]["SignedInPerson"];
            /** @description What the roles allow, without regard to an object */
            permissions: ("register.read" | "register.read-unapproved" | "correlation.evaluate" | "evaluation.read-all" | "correlation.draft" | "correlation.submit" | "correlation.comment" | "attachment.add" | "correlation.review" | "correlation.approve" | "correlation.suspend" | "correlation.withdraw" | "problem-report.file" | "problem-report.answer" | "register.export" | "register.import" | "people.list" | "people.manage" | "appointment.read" | "appointment.propose" | "appointment.end" | "settings.read" | "settings.change" | "journal.read" | "journal.verify" | "mail.read")[];
        };
        DemoPerson: {
            name: string;
            email: string;
            roles: ("engineer" | "reviewer" | "authority" | "auditor" | "administrator")[];
        };
        DemoPeopleResponse: {
            items: components["schemas"]["DemoPerson"][];
            /** @description The password of all of them */
            password: string;
        };
        SessionItem: {
            /** @description Names the session; opens nothing */
            id: string;
            /** Format: date-time */
            createdAt: string;
            /** Format: date-time */
            lastSeenAt: string;
            /** @description What the browser says of itself; anybody can say anything */
            agent: string;
            /** @description The one in use */
            current: boolean;
        };
        SessionsResponse: {
            /** @description The one used last first */
            items: components["schemas"]["SessionItem"][];
        };
        PasswordChangeDto: {
            /**
             * Format: password
             * @description The present password
             */
            current: string;
            /**
             * Format: password
             * @description The new one: 8 to 128 characters, 15 or more are better
             */
            password: string;
        };
        Principal: {
            id: string;
            name: string;
        };
        SettingsResponse: {
            officeName: string;
            /** @description How many favourable reviews an approval rests on */
            reviewsNeeded: number;
            /** @description Who confirms appointments besides the technical authorities */
            principal: components["schemas"]["Principal"] | null;
            /** @description Months after which an approved revision is due for review */
            reviewDueMonths: number;
        };
        SettingsDto: {
            officeName: string;
            reviewsNeeded: number;
            /** @description A person's id; null for nobody */
            principal: string | null;
            reviewDueMonths: number;
        };
        InvitationDto: {
            name: string;
            /** Format: email */
            email: string;
            roles: ("engineer" | "reviewer" | "authority" | "auditor" | "administrator")[];
        };
        InvitationResponse: {
            /** @description null: the first administrator says so */
            name: string | null;
            /** @description null: the first administrator says so */
            email: string | null;
        };
        AcceptanceDto: {
            /**
             * Format: password
             * @description 8 to 128 characters, 15 or more are better
             */
            password: string;
            name?: string;
            /** Format: email */
            email?: string;
        };
        JoinedResponse: {
            name: string;
            /** @description The address to sign in with */
            email: string;
        };
        ResetRequestDto: {
            email: string;
        };
        ResetAskedResponse: {
            /** @description The same for every address */
            message: string;
        };
        ResetDto: {
            /**
             * Format: password
             * @description 8 to 128 characters, 15 or more are better
             */
            password: string;
        };
        NoticeItem: {
            id: number;
            /** @enum {string} */
            kind: "review-asked" | "comment" | "verdict" | "approval" | "withdrawal" | "reminder" | "appointment" | "report";
            text: string;
            /** @description A path in the screens */
            href: string;
            /** Format: date-time */
            at: string;
            read: boolean;
        };
        NoticesResponse: {
            /** @description The latest first */
            items: components["schemas"]["NoticeItem"][];
            unread: number;
            nextCursor: string | null;
        };
        NoticeChoices: {
            /** @description Which kinds come by mail, too */
            mail: {
                "review-asked": boolean;
                comment: boolean;
                verdict: boolean;
                approval: boolean;
                withdrawal: boolean;
                reminder: boolean;
                appointment: boolean;
                report: boolean;
            };
        };
        MailChoices: {
            /** @description Left out, it stays as it is */
            "review-asked"?: boolean;
            /** @description Left out, it stays as it is */
            comment?: boolean;
            /** @description Left out, it stays as it is */
            verdict?: boolean;
            /** @description Left out, it stays as it is */
            approval?: boolean;
            /** @description Left out, it stays as it is */
            withdrawal?: boolean;
            /** @description Left out, it stays as it is */
            reminder?: boolean;
            /** @description Left out, it stays as it is */
            appointment?: boolean;
            /** @description Left out, it stays as it is */
            report?: boolean;
        };
        NoticeChoicesDto: {
            mail: components["schemas"]["MailChoices"];
        };
        AppointmentPerson: {
            id: string;
            name: string;
        };
        AppointmentStep: {
            /** Format: date-time */
            at: string;
            by: components["schemas"]["AppointmentPerson"];
        };
        AppointmentAbilities: {
            confirm: boolean;
            end: boolean;
        };
        AppointmentItem: {
            id: string;
            person: components["schemas"]["AppointmentPerson"];
            /** @description Slugs of geometries; all: every one, and property equations too */
            geometries: "all" | string[];
            /**
             * Format: date
             * @description Last day, UTC
             */
            until: string;
            /** @enum {string} */
            state: "proposed" | "current" | "ended";
            proposed: components["schemas"]["AppointmentStep"];
            confirmed: components["schemas"]["AppointmentStep"] | null;
            ended: components["schemas"]["AppointmentStep"] | null;
            endReason: string | null;
            /** @description What the caller may do with it now */
            abilities: components["schemas"]["AppointmentAbilities"];
        };
        AppointmentsResponse: {
            /** @description The latest proposal first */
            items: components["schemas"]["AppointmentItem"][];
        };
        ProposalDto: {
            /** @description The person's id */
            person: string;
            /** @description Slugs of geometries; all: every one, and property equations too */
            geometries: "all" | string[];
            /**
             * Format: date
             * @description Last day, UTC
             */
            until: string;
        };
        ConfirmationDto: {
            /**
             * Format: password
             * @description The caller's own password, once more
             */
            password: string;
        };
        EndDto: {
            reason: string;
        };
        GeometryEntry: {
            slug: string;
            name: string;
            summary: string;
            /** @description The length that correlations of this geometry are usually put on */
            characteristicLength: string;
            velocity: string;
            cautions: string[];
            /** @description Correlations that the caller may see */
            total: number;
            /** @description Those of them with an approved revision */
            approved: number;
        };
        GeometriesResponse: {
            items: components["schemas"]["GeometryEntry"][];
        };
        ListedPropertyEquation: {
            slug: string;
            title: string;
            fluid: string;
            /** @description Dictionary name of what it gives */
            gives: string;
            unit: string;
            revision: number;
            hash: string;
            /** @enum {string} */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
        };
        PropertyEquationsResponse: {
            items: components["schemas"]["ListedPropertyEquation"][];
        };
        CheckedValueDto: {
            symbol: string;
            expected: number;
            found: number | null;
            deviationPercent: number | null;
            unit: string;
            passed: boolean;
        };
        FindingDto: {
            /** @description Symbol on the sheet; `rho.T` for T of the equation that fills rho */
            symbol: string;
            /** @enum {string} */
            kind: "within" | "near" | "outside" | "past-reach" | "between" | "unchecked";
            value: number | null;
            unit: string;
            lo: number | null;
            hi: number | null;
            loClosed: boolean;
            hiClosed: boolean;
            /** @enum {string|null} */
            nature: "data" | "regime" | "definition" | "physical" | null;
            /** @enum {string} */
            basis: "stated" | "handbook" | "common-practice" | "none";
            /** @description Value over the upper limit, or lower limit over value */
            ratio: number | null;
            /** @description Whether a reasoned deviation may be recorded */
            deviable: boolean;
            /** @description Sheets named as holding on the other side */
            beyond: string[];
            message: string;
        };
        CheckProblemDto: {
            code: string;
            field: string;
            message: string;
        };
        CheckReportDto: {
            title: string;
            /** @enum {string} */
            kind: "published" | "computed";
            source: string | null;
            note: string | null;
            tolerancePercent: number;
            passed: boolean;
            values: components["schemas"]["CheckedValueDto"][];
            findings: components["schemas"]["FindingDto"][];
            problems: components["schemas"]["CheckProblemDto"][];
        };
        PropertyEquationSheet: {
            slug: string;
            title: string;
            fluid: string;
            /** @description Dictionary name of what it gives */
            gives: string;
            unit: string;
            revision: number;
            hash: string;
            /** @enum {string} */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            definition: components["schemas"]["PropertyEquationDefinition"];
            checks: components["schemas"]["CheckReportDto"][];
            /** @description Why it is not approved */
            standingNote: string | null;
            caution: string;
        };
        ComparedRevision: {
            revision: number;
            hash: string;
        };
        DifferenceDto: {
            /** @description Path with names for places: `bounds[Re].stretches[0].hi.value` */
            path: string;
            /** @description Top-level field that it belongs to */
            section: string;
            /** @enum {string} */
            change: "added" | "removed" | "changed";
            /** @description Null where there was nothing */
            before: ({
                [key: string]: unknown;
            } | unknown[] | string | number | boolean) | null;
            /** @description Null where there is nothing any more */
            after: ({
                [key: string]: unknown;
            } | unknown[] | string | number | boolean) | null;
        };
        DifferencesResponse: {
            from: components["schemas"]["ComparedRevision"];
            to: components["schemas"]["ComparedRevision"];
            differences: components["schemas"]["DifferenceDto"][];
            before: components["schemas"]["CorrelationDefinition"];
            after: components["schemas"]["CorrelationDefinition"];
        };
        BoundEndDto: {
            value: number;
            /** @enum {string} */
            nature: "data" | "regime" | "definition" | "physical";
            /** @default true */
            closed: boolean;
            reach?: number;
            beyond?: string[];
        };
        StretchDto: {
            lo?: components["schemas"]["BoundEndDto"];
            hi?: components["schemas"]["BoundEndDto"];
        };
        ListedBound: {
            symbol: string;
            name: string;
            unit: string;
            /** @enum {string} */
            basis: "stated" | "handbook" | "common-practice" | "none";
            stretches: components["schemas"]["StretchDto"][];
        };
        ListedCorrelation: {
            slug: string;
            title: string;
            authors: string[];
            year: number | null;
            geometry: string;
            geometryName: string;
            /** @enum {string} */
            phase: "gas" | "liquid" | "gas-or-liquid" | "gas-and-liquid";
            /** @enum {string} */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            revision: number;
            summary: string;
            /** @enum {string} */
            verification: "published-example" | "expression-seen" | "from-memory";
            bounds: components["schemas"]["ListedBound"][];
        };
        FacetCount: {
            value: string;
            label: string;
            count: number;
        };
        CorrelationFacets: {
            geometry: components["schemas"]["FacetCount"][];
            phase: components["schemas"]["FacetCount"][];
            standing: components["schemas"]["FacetCount"][];
        };
        CorrelationPage: {
            items: components["schemas"]["ListedCorrelation"][];
            nextCursor: string | null;
            total: number;
            /** @description Each counted without the filter on itself */
            facets: components["schemas"]["CorrelationFacets"];
        };
        NewCorrelationBody: {
            definition: components["schemas"]["CorrelationDefinition"];
            slug: string;
        };
        NamedPerson: {
            id: string;
            name: string;
        };
        SheetRevision: {
            number: number;
            /** @enum {string} */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            hash: string;
            /**
             * Format: date-time
             * @description When it got this standing
             */
            at: string;
        };
        SheetHistoryEntry: {
            /** @enum {string} */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            /** Format: date-time */
            at: string;
            by: components["schemas"]["NamedPerson"];
            note: string | null;
            /**
             * @description Of a withdrawal
             * @enum {string|null}
             */
            class: "error-in-sheet" | "error-in-source" | "unsafe" | null;
        };
        SheetReview: {
            reviewer: components["schemas"]["NamedPerson"];
            /** @enum {string} */
            verdict: "recommend" | "ask-for-changes" | "decline";
            /** Format: date-time */
            at: string;
            note: string | null;
            /** @description The content it speaks of */
            hash: string;
            /** @description Whether it speaks of the present content */
            current: boolean;
        };
        SheetComment: {
            id: number;
            /** @description Path in the definition; empty for the whole */
            field: string;
            text: string;
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
            hash: string;
        };
        SheetApproval: {
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
            /** @description What the signature means, in words */
            meaning: string;
            /** @description The content that was signed */
            hash: string;
        };
        SheetUsage: {
            evaluations: number;
            calculations: number;
        };
        SheetEquation: {
            slug: string;
            revision: number;
            hash: string;
            definition: components["schemas"]["PropertyEquationDefinition"];
        };
        SheetAbilities: {
            evaluate: boolean;
            edit: boolean;
            submit: boolean;
            comment: boolean;
            review: boolean;
            approve: boolean;
            decline: boolean;
            suspend: boolean;
            reinstate: boolean;
            withdraw: boolean;
        };
        SheetSuccessor: {
            slug: string;
            revision: number;
            title: string;
        };
        SheetWithdrawal: {
            reason: string;
            /** @enum {string} */
            class: "error-in-sheet" | "error-in-source" | "unsafe";
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
        };
        SheetSuspension: {
            reason: string;
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
            /** @description The problem report that is being looked into */
            problemReport: number | null;
        };
        InspectionSummary: {
            passed: boolean;
            warnings: number;
            errors: number;
        };
        Sheet: {
            slug: string;
            title: string;
            geometry: string;
            geometryName: string;
            /** @enum {string} */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            revision: number;
            iteration: number;
            /** @description SHA-256 of the RFC 8785 text of the definition; also the ETag */
            hash: string;
            definition: components["schemas"]["CorrelationDefinition"];
            originator: components["schemas"]["NamedPerson"];
            /** @description Those that the caller may see */
            revisions: components["schemas"]["SheetRevision"][];
            history: components["schemas"]["SheetHistoryEntry"][];
            reviews: components["schemas"]["SheetReview"][];
            comments: components["schemas"]["SheetComment"][];
            approval: components["schemas"]["SheetApproval"] | null;
            checks: components["schemas"]["CheckReportDto"][];
            /** @description Why it is not approved */
            standingNote: string | null;
            usage: components["schemas"]["SheetUsage"];
            /** @description Every property equation the sheet lists, and those they need */
            equations: components["schemas"]["SheetEquation"][];
            /** @description What the caller may do with this revision now */
            abilities: components["schemas"]["SheetAbilities"];
            /**
             * Format: date-time
             * @description From when on its approval holds
             */
            effectiveFrom: string | null;
            /**
             * Format: date-time
             * @description When it is to be looked at again
             */
            reviewDue: string | null;
            /** @description Approved, and neither before its effective date nor superseded */
            inForce: boolean;
            /** @description What to turn to instead */
            successor: components["schemas"]["SheetSuccessor"] | null;
            withdrawal: components["schemas"]["SheetWithdrawal"] | null;
            suspension: components["schemas"]["SheetSuspension"] | null;
            /** @description Problem reports on this revision that nobody answered yet */
            openReports: number;
            /** @description Of the last machine check */
            inspection: components["schemas"]["InspectionSummary"] | null;
            caution: string;
        };
        DefinitionBody: {
            definition: components["schemas"]["CorrelationDefinition"];
        };
        SubmissionBody: {
            /** @description People asked to review it, by id */
            reviewers?: string[];
            /** @description What the reviewers should know */
            note?: string;
        };
        NoteBody: {
            /** @description What was done about it */
            note?: string;
        };
        ChecklistDto: {
            /** @description The expression is that of the source */
            expression: boolean;
            /** @description Every symbol is defined as in the source */
            definitions: boolean;
            /** @description The ranges are those of the source */
            ranges: boolean;
            /** @description The basis of each bound and of the coefficient is right */
            basis: boolean;
            /** @description A worked check was recalculated by other means */
            recalculated: boolean;
            /** @description The register has no second sheet of the same equation */
            duplicates: boolean;
        };
        ReviewBody: {
            /** @enum {string} */
            verdict: "recommend" | "ask-for-changes" | "decline";
            checklist: components["schemas"]["ChecklistDto"];
            /** @description Needed where the verdict is not to recommend */
            note?: string;
        };
        ApprovalBody: {
            /**
             * Format: password
             * @description The caller's own password, once more
             */
            password: string;
            /** @description What the signature means */
            meaning: string;
            /** @description Hash of the content that is signed */
            hash: string;
            note?: string;
            /**
             * @description From when on it holds: a day (from midnight UTC) or a moment; at once without it
             * @example 2027-01-31
             */
            effectiveFrom?: string;
            /**
             * @description When it is to be looked at again; after the office's number of months without it
             * @example 2030-01-31
             */
            reviewDue?: string;
        };
        ReasonBody: {
            reason: string;
        };
        SuspensionBody: {
            reason: string;
            /** @description The open problem report that is being looked into */
            problemReport?: number;
        };
        WithdrawalBody: {
            reason: string;
            /** @enum {string} */
            class: "error-in-sheet" | "error-in-source" | "unsafe";
            /** @description Slug of the correlation to turn to */
            successor?: string;
        };
        CommentBody: {
            /** @description Path in the definition, such as `bounds[0]`; empty: the whole */
            field: string;
            text: string;
        };
        TextBody: {
            text: string;
        };
        RemarkDto: {
            /** @enum {string} */
            verdict: "passed" | "warning" | "error";
            /** @enum {string} */
            topic: "definition" | "checks" | "range" | "seams" | "bounds" | "sources";
            /** @description Path in the definition; empty for the whole */
            field: string;
            message: string;
        };
        InspectionReportDto: {
            passed: boolean;
            remarks: components["schemas"]["RemarkDto"][];
            checks: components["schemas"]["CheckReportDto"][];
        };
        ReviewAssignmentItem: {
            reviewer: components["schemas"]["NamedPerson"];
            /**
             * @description Asked on submission, or came by themselves
             * @enum {string}
             */
            how: "named" | "taken";
            /** Format: date-time */
            at: string;
        };
        ReviewVerdict: {
            reviewer: components["schemas"]["NamedPerson"];
            /** @enum {string} */
            verdict: "recommend" | "ask-for-changes" | "decline";
            checklist: components["schemas"]["ChecklistDto"];
            note: string | null;
            /** Format: date-time */
            at: string;
            iteration: number;
            hash: string;
            /** @description Whether it speaks of the present iteration; else it is void */
            current: boolean;
        };
        CommentResolution: {
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
        };
        CommentAnswer: {
            id: number;
            text: string;
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
        };
        CommentAbilities: {
            answer: boolean;
            resolve: boolean;
        };
        ReviewComment: {
            id: number;
            /** @description Path in the definition; empty for the whole */
            field: string;
            text: string;
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
            /** @description The iteration it was made on */
            iteration: number;
            resolved: components["schemas"]["CommentResolution"] | null;
            answers: components["schemas"]["CommentAnswer"][];
            abilities: components["schemas"]["CommentAbilities"];
        };
        ReviewRound: {
            round: number;
            iteration: number;
            /** Format: date-time */
            at: string;
            note: string | null;
            by: components["schemas"]["NamedPerson"];
        };
        ReviewIteration: {
            number: number;
            /** Format: date-time */
            at: string;
            hash: string;
            /** @description To the one before in this list */
            differences: components["schemas"]["DifferenceDto"][];
        };
        ReviewAbilities: {
            take: boolean;
            comment: boolean;
            /** @description At least one of the comments */
            resolve: boolean;
            verdict: boolean;
            /** @description Say that it is ready again */
            putForward: boolean;
            approve: boolean;
            decline: boolean;
            edit: boolean;
            suspend: boolean;
            reinstate: boolean;
            withdraw: boolean;
        };
        ReviewCount: {
            /** @description Favourable reviews of the present iteration */
            favourable: number;
            needed: number;
        };
        ReviewPage: {
            slug: string;
            title: string;
            revision: number;
            iteration: number;
            hash: string;
            /** @enum {string} */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            originator: components["schemas"]["NamedPerson"];
            /**
             * @description Whose turn it is
             * @enum {string}
             */
            hands: "originator" | "reviewers";
            definition: components["schemas"]["CorrelationDefinition"];
            /** @description What the machine found when it was last put forward */
            inspection: components["schemas"]["InspectionReportDto"] | null;
            /** @description Favourable reviews that an approval rests on, by the office's settings */
            reviewersNeeded: number;
            assignments: components["schemas"]["ReviewAssignmentItem"][];
            /** @description Current and void ones, in the order given */
            verdicts: components["schemas"]["ReviewVerdict"][];
            comments: components["schemas"]["ReviewComment"][];
            /** @description Each time it was put forward */
            rounds: components["schemas"]["ReviewRound"][];
            /** @description What reviewers had before them, and the present content */
            iterations: components["schemas"]["ReviewIteration"][];
            abilities: components["schemas"]["ReviewAbilities"];
            approvals: components["schemas"]["ReviewCount"];
        };
        ProblemReportAnswer: {
            /** @enum {string} */
            outcome: "no-fault" | "suspended" | "corrected";
            text: string;
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
        };
        ProblemReportAbilities: {
            answer: boolean;
        };
        ProblemReport: {
            id: number;
            slug: string;
            revision: number;
            /** @description The content it speaks of */
            hash: string;
            /** @enum {string} */
            severity: "question" | "error" | "unsafe";
            text: string;
            by: components["schemas"]["NamedPerson"];
            /** Format: date-time */
            at: string;
            /** @description Null while it is open */
            answer: components["schemas"]["ProblemReportAnswer"] | null;
            abilities: components["schemas"]["ProblemReportAbilities"];
        };
        ProblemReportsResponse: {
            items: components["schemas"]["ProblemReport"][];
        };
        ProblemReportBody: {
            /** @description Number of the revision it is about */
            revision: number;
            text: string;
            /** @enum {string} */
            severity: "question" | "error" | "unsafe";
        };
        ProblemReportAnswerBody: {
            text: string;
            /** @enum {string} */
            outcome: "no-fault" | "suspended" | "corrected";
        };
        AttachmentItem: {
            id: string;
            /** @description Index of the source that it was attached to, as the sources stand now; null when cited no more */
            source: number | null;
            /** @description That source as it was cited then */
            citation: string | null;
            name: string;
            /**
             * @description Told from the content
             * @enum {string}
             */
            mediaType: "application/pdf" | "image/png" | "image/jpeg";
            /** @description Bytes */
            size: number;
            /** @description SHA-256 of the bytes, hex */
            sha256: string;
            /**
             * @description Whether it may leave the office, in an evidence pack for one
             * @enum {string}
             */
            licence: "may-leave" | "office-only";
            /** @description What of it would act when opened */
            activeContent: ("script" | "launch" | "embedded-file" | "open-action" | "event-action" | "rich-media" | "form" | "not-inspected")[];
            /** Format: date-time */
            at: string;
            by: components["schemas"]["NamedPerson"];
        };
        AttachmentAbilities: {
            add: boolean;
        };
        AttachmentsResponse: {
            /** @description The oldest first */
            items: components["schemas"]["AttachmentItem"][];
            abilities: components["schemas"]["AttachmentAbilities"];
        };
        LicenceBody: {
            /** @enum {string} */
            licence: "may-leave" | "office-only";
        };
        CandidatesBody: {
            geometry: string;
            /** @enum {string} */
            phase?: "gas" | "liquid";
            /** @description By dictionary name, such as `gas-density`; without a unit in the dictionary's own */
            inputs: {
                [key: string]: components["schemas"]["InputValueDto"];
            };
        };
        ResultValueDto: {
            symbol: string;
            value: number;
            unit: string;
        };
        CoefficientValueDto: {
            symbol: string;
            value: number;
            unit: string;
            /** @enum {string} */
            basis: "concentration" | "partial-pressure" | "mole-fraction";
            /** @enum {string} */
            per: "area" | "volume";
            /** @enum {string} */
            rateForm: "dilute-or-equimolar" | "stagnant-inert" | "drift-free";
        };
        Candidate: {
            slug: string;
            title: string;
            revision: number;
            /** @enum {string} */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            /** @description False: for comparison only, the revision is not in use */
            inUse: boolean;
            /** @enum {string} */
            outcome: "within" | "unchecked" | "refused" | "incomplete";
            result: components["schemas"]["ResultValueDto"] | null;
            coefficient: components["schemas"]["CoefficientValueDto"] | null;
            findings: components["schemas"]["FindingDto"][];
            /** @description Of a refusal: how many times past the worst bound */
            farthest: number | null;
            /** @description Dictionary names of what it still needs */
            missing: string[];
            /** @description Why the values given cannot be used, in sentences */
            problems: string[];
        };
        CandidatesResponse: {
            /** @description Ranked: within, near a bound, unchecked, refused, incomplete */
            items: components["schemas"]["Candidate"][];
            caution: string;
        };
        ReadingBody: {
            /** @description References as pasted: 200 kB and 50 references at most */
            text: string;
            /**
             * @description Told from the text when left out
             * @enum {string}
             */
            format?: "bibtex" | "ris" | "csl-json";
        };
        ReadingProblem: {
            /** @description `items.2.DOI` for what was read; `text` for what was not */
            field: string;
            message: string;
        };
        ReadingDuplicate: {
            /** @description Index of the earlier item */
            first: number;
            /** @description Index of the later item */
            second: number;
            /**
             * @description By the DOI, or by first author, year, container and first page
             * @enum {string}
             */
            by: "doi" | "place";
        };
        ReadingCitedBy: {
            /** @description Index of the item */
            item: number;
            /** @enum {string} */
            kind: "correlation" | "property-equation";
            slug: string;
            title: string;
            /** @enum {string} */
            by: "doi" | "place";
        };
        ReadingResponse: {
            /** @enum {string} */
            format: "bibtex" | "ris" | "csl-json";
            /** @description CSL-JSON items with the fields that a sheet keeps */
            items: {
                [key: string]: unknown;
            }[];
            /** @description What was changed or left out, to be looked at */
            problems: components["schemas"]["ReadingProblem"][];
            /** @description Items that name one work */
            duplicates: components["schemas"]["ReadingDuplicate"][];
            /** @description Sheets that cite an item already */
            alreadyCitedBy: components["schemas"]["ReadingCitedBy"][];
        };
        DeskItem: {
            title: string;
            /** @description What waits, in a line */
            line: string;
            /** @description A path of the screens */
            href: string;
            /**
             * Format: date-time
             * @description Since when; of what is due, when
             */
            at: string;
        };
        DeskSection: {
            /** @enum {string} */
            key: "drafts" | "to-review" | "open-comments" | "to-take" | "to-approve" | "reports" | "due" | "appointments" | "notices";
            title: string;
            /** @description What to say when nothing waits */
            empty: string;
            items: components["schemas"]["DeskItem"][];
        };
        Desk: {
            sections: components["schemas"]["DeskSection"][];
        };
        DeviationDto: {
            /** @description Symbol of the finding it answers */
            symbol: string;
            reason: string;
        };
        InputValueDto: {
            value: number;
            /** @description The sheet's own unit when left out */
            unit?: string;
        };
        DrivingForceDto: {
            /** @enum {string} */
            kind: "concentration" | "partial-pressure" | "mole-fraction";
            interface: components["schemas"]["InputValueDto"];
            bulk: components["schemas"]["InputValueDto"];
        };
        EvaluationBody: {
            /** @description The approved one, else the latest the caller may see, when left out */
            revision?: number;
            /** @description Quantities or groups by symbol; `rho.T` for T of the equation that fills rho */
            inputs: {
                [key: string]: components["schemas"]["InputValueDto"];
            };
            /** @description Row by table name */
            rows?: {
                [key: string]: string;
            };
            /** @description Property equation by the symbol it fills */
            equations?: {
                [key: string]: string;
            };
            bases?: ("k_c" | "k_G" | "k_y" | "F" | "k_L" | "k_x")[];
            deviations?: components["schemas"]["DeviationDto"][];
            drivingForce?: components["schemas"]["DrivingForceDto"];
        };
        ConversionDto: {
            /** @enum {string} */
            basis: "k_c" | "k_G" | "k_y" | "F" | "k_L" | "k_x";
            symbol: string;
            value: number | null;
            unit: string;
            /** @description What must be known first; empty when there is a value */
            missing: string[];
            assumes?: string;
        };
        PartOutcomeDto: {
            key: string;
            title: string;
            result: components["schemas"]["ResultValueDto"];
            coefficient: components["schemas"]["CoefficientValueDto"] | null;
            conversions: components["schemas"]["ConversionDto"][];
        };
        FluxDto: {
            value: number;
            unit: string;
            /** @enum {string} */
            basis: "concentration" | "partial-pressure" | "mole-fraction";
            warnings: string[];
        };
        StepDto: {
            /** @enum {string} */
            kind: "quantity" | "property" | "group" | "intermediate" | "result" | "coefficient" | "conversion" | "flux";
            symbol: string;
            symbolTex: string;
            tex: string;
            texWithNumbers: string;
            value: number;
            unit: string;
            note?: string;
        };
        UsedEquationDto: {
            /** @description The symbol that was filled */
            symbol: string;
            key: string;
            value: number;
            unit: string;
            title: string;
            assumes?: string;
        };
        EquationProvenance: {
            key: string;
            revision: number;
            hash: string;
        };
        ProvenanceDto: {
            slug: string;
            revision: number;
            hash: string;
            /** @description Version of the calculation */
            engine: string;
            equations: components["schemas"]["EquationProvenance"][];
            rows: {
                [key: string]: string;
            };
        };
        WithinEvaluation: {
            /** Format: uuid */
            id: string;
            /** Format: date-time */
            at: string;
            slug: string;
            revision: number;
            /**
             * @description Standing of the revision at the time
             * @enum {string}
             */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            groups: {
                [key: string]: number;
            };
            intermediates: {
                [key: string]: {
                    value: number;
                    unit: string;
                };
            };
            result: components["schemas"]["ResultValueDto"];
            coefficient: components["schemas"]["CoefficientValueDto"] | null;
            conversions: components["schemas"]["ConversionDto"][];
            parts: components["schemas"]["PartOutcomeDto"][];
            flux: components["schemas"]["FluxDto"] | null;
            findings: components["schemas"]["FindingDto"][];
            steps: components["schemas"]["StepDto"][];
            equations: components["schemas"]["UsedEquationDto"][];
            rows: {
                [key: string]: string;
            };
            remarks: string[];
            provenance: components["schemas"]["ProvenanceDto"];
            caution: string;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            outcome: "within";
        };
        UncheckedEvaluation: {
            /** Format: uuid */
            id: string;
            /** Format: date-time */
            at: string;
            slug: string;
            revision: number;
            /**
             * @description Standing of the revision at the time
             * @enum {string}
             */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            groups: {
                [key: string]: number;
            };
            intermediates: {
                [key: string]: {
                    value: number;
                    unit: string;
                };
            };
            result: components["schemas"]["ResultValueDto"];
            coefficient: components["schemas"]["CoefficientValueDto"] | null;
            conversions: components["schemas"]["ConversionDto"][];
            parts: components["schemas"]["PartOutcomeDto"][];
            flux: components["schemas"]["FluxDto"] | null;
            findings: components["schemas"]["FindingDto"][];
            steps: components["schemas"]["StepDto"][];
            equations: components["schemas"]["UsedEquationDto"][];
            rows: {
                [key: string]: string;
            };
            remarks: string[];
            provenance: components["schemas"]["ProvenanceDto"];
            caution: string;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            outcome: "unchecked";
        };
        DeviatingEvaluation: {
            /** Format: uuid */
            id: string;
            /** Format: date-time */
            at: string;
            slug: string;
            revision: number;
            /**
             * @description Standing of the revision at the time
             * @enum {string}
             */
            standing: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
            groups: {
                [key: string]: number;
            };
            intermediates: {
                [key: string]: {
                    value: number;
                    unit: string;
                };
            };
            result: components["schemas"]["ResultValueDto"];
            coefficient: components["schemas"]["CoefficientValueDto"] | null;
            conversions: components["schemas"]["ConversionDto"][];
            parts: components["schemas"]["PartOutcomeDto"][];
            flux: components["schemas"]["FluxDto"] | null;
            findings: components["schemas"]["FindingDto"][];
            steps: components["schemas"]["StepDto"][];
            equations: components["schemas"]["UsedEquationDto"][];
            rows: {
                [key: string]: string;
            };
            remarks: string[];
            provenance: components["schemas"]["ProvenanceDto"];
            caution: string;
            /**
             * @description discriminator enum property added by openapi-typescript
             * @enum {string}
             */
            outcome: "deviating";
            /** @enum {string} */
            mark: "provisional, not for design";
            deviations: components["schemas"]["DeviationDto"][];
        };
        KeptEvaluation: {
            /** Format: uuid */
            id: string;
            /** Format: date-time */
            at: string;
            person: components["schemas"]["NamedPerson"];
            /** @description What was asked */
            request: components["schemas"]["EvaluationBody"];
            evaluation: components["schemas"]["WithinEvaluation"] | components["schemas"]["UncheckedEvaluation"] | components["schemas"]["DeviatingEvaluation"];
        };
        ImportedRegister: {
            geometries: number;
            correlations: number;
            propertyEquations: number;
            revisions: number;
            /** @description Entries of the journals that came along */
            journalEntries: number;
        };
        FieldProblemResponse: {
            /** @description Path in the request, such as inputs.u.value */
            field: string;
            code: string;
            message: string;
        };
        AlternativeResponse: {
            slug: string;
            title: string;
            geometry: string;
        };
        ProblemResponse: {
            /** @example urn:merestone:problem:out-of-bounds */
            type: string;
            title: string;
            status: number;
            /** @description What is so and what to do */
            detail: string;
            /** @description Names one unexpected failure in the log */
            instance?: string;
            fields?: components["schemas"]["FieldProblemResponse"][];
            findings?: {
                [key: string]: unknown;
            }[];
            alternatives?: components["schemas"]["AlternativeResponse"][];
            /** @description Of a submission that the machine stopped */
            inspection?: components["schemas"]["InspectionReportDto"];
        };
        CorrelationDefinition: {
            /** @enum {string} */
            format: "merestone-sheet/1";
            title: string;
            authors: string[];
            year: number | null;
            geometry: string;
            /** @enum {string} */
            phase: "gas" | "liquid" | "gas-or-liquid" | "gas-and-liquid";
            summary: string;
            /** @enum {string} */
            averaging: "average" | "local" | "not-stated";
            /** @enum {string} */
            wall: "constant-concentration" | "constant-flux" | "not-applicable" | "not-stated";
            /** @enum {string} */
            drivingForce: "local" | "log-mean" | "inlet" | "not-stated";
            /** @enum {string} */
            propertyState: "film" | "bulk" | "interface" | "inlet" | "not-stated";
            quantities: {
                symbol: string;
                is: string;
                unit: string;
                tex?: string;
                /** @enum {string} */
                role?: "characteristic-length" | "velocity" | "state";
                /** @enum {string} */
                at?: "film" | "bulk" | "interface" | "wall" | "inlet";
                meaning?: string;
                equations?: string[];
                table?: string;
            }[];
            tables?: {
                name: string;
                title: string;
                source?: string;
                rows: {
                    key: string;
                    label: string;
                    values: {
                        [key: string]: number;
                    };
                    note?: string;
                }[];
            }[];
            groups: {
                symbol: string;
                name: string;
                expression: string;
                tex?: string;
                note?: string;
            }[];
            intermediates?: {
                symbol: string;
                name: string;
                unit: string;
                tex?: string;
                expression?: string;
                pieces?: {
                    title?: string;
                    when: {
                        on: string;
                        lo?: number;
                        hi?: number;
                        loClosed?: boolean;
                        hiClosed?: boolean;
                    }[];
                    expression: string;
                }[];
                dimensional?: boolean;
                note?: string;
            }[];
            bounds: {
                on: string;
                stretches: {
                    lo?: {
                        value: number;
                        /** @enum {string} */
                        nature: "data" | "regime" | "definition" | "physical";
                        closed?: boolean;
                        reach?: number;
                        beyond?: string[];
                    };
                    hi?: {
                        value: number;
                        /** @enum {string} */
                        nature: "data" | "regime" | "definition" | "physical";
                        closed?: boolean;
                        reach?: number;
                        beyond?: string[];
                    };
                }[];
                /** @enum {string} */
                basis: "stated" | "handbook" | "common-practice" | "none";
                place?: string;
                note?: string;
            }[];
            parts: {
                key: string;
                title: string;
                /** @enum {string} */
                phase?: "gas" | "liquid";
                result: {
                    symbol: string;
                    tex?: string;
                    /** @enum {string} */
                    kind: "Sherwood" | "Stanton" | "j-factor" | "coefficient" | "volumetric-coefficient" | "interfacial-area";
                    unit: string;
                    expression?: string;
                    pieces?: {
                        title?: string;
                        when: {
                            on: string;
                            lo?: number;
                            hi?: number;
                            loClosed?: boolean;
                            hiClosed?: boolean;
                        }[];
                        expression: string;
                    }[];
                    dimensional?: boolean;
                };
                coefficient: {
                    symbol: string;
                    tex?: string;
                    unit: string;
                    /** @enum {string} */
                    basis: "concentration" | "partial-pressure" | "mole-fraction";
                    /** @enum {string} */
                    per: "area" | "volume";
                    /** @enum {string} */
                    rateForm: "dilute-or-equimolar" | "stagnant-inert" | "drift-free";
                    expression: string;
                } | null;
            }[];
            accuracy: {
                valuePercent: number | null;
                /** @enum {string} */
                statistic: "max" | "mean" | "rms" | "95 %" | "not-stated";
                of?: string;
                text: string;
            } | null;
            restrictions: string[];
            cautions: string[];
            sources: {
                csl: {
                    type: string;
                    title?: string;
                    author?: {
                        family?: string;
                        given?: string;
                        literal?: string;
                    }[];
                    issued?: {
                        "date-parts": (number | string)[][];
                    };
                    "container-title"?: string;
                    publisher?: string;
                    edition?: string | number;
                    volume?: string | number;
                    issue?: string | number;
                    page?: string;
                    DOI?: string;
                } & {
                    [key: string]: unknown;
                };
                place: string;
                gives?: string;
                /** @enum {string} */
                read: "seen" | "memory";
            }[];
            checks: {
                title: string;
                /** @enum {string} */
                kind: "published" | "computed";
                source?: string;
                inputs: {
                    [key: string]: {
                        value: number;
                        unit?: string;
                    };
                };
                rows?: {
                    [key: string]: string;
                };
                equations?: {
                    [key: string]: string;
                };
                expected: {
                    [key: string]: {
                        value: number;
                        unit?: string;
                    };
                };
                tolerancePercent: number;
                note?: string;
            }[];
            verification: {
                /** @enum {string} */
                status: "published-example" | "expression-seen" | "from-memory";
                note: string;
            };
        };
        PropertyEquationDefinition: {
            /** @enum {string} */
            format: "merestone-property/1";
            title: string;
            fluid: string;
            gives: string;
            unit: string;
            assumes?: string;
            quantities: {
                symbol: string;
                is: string;
                unit: string;
                tex?: string;
                /** @enum {string} */
                role?: "characteristic-length" | "velocity" | "state";
                /** @enum {string} */
                at?: "film" | "bulk" | "interface" | "wall" | "inlet";
                meaning?: string;
                equations?: string[];
                table?: string;
            }[];
            tables?: {
                name: string;
                title: string;
                source?: string;
                rows: {
                    key: string;
                    label: string;
                    values: {
                        [key: string]: number;
                    };
                    note?: string;
                }[];
            }[];
            intermediates?: {
                symbol: string;
                name: string;
                unit: string;
                tex?: string;
                expression?: string;
                pieces?: {
                    title?: string;
                    when: {
                        on: string;
                        lo?: number;
                        hi?: number;
                        loClosed?: boolean;
                        hiClosed?: boolean;
                    }[];
                    expression: string;
                }[];
                dimensional?: boolean;
                note?: string;
            }[];
            bounds: {
                on: string;
                stretches: {
                    lo?: {
                        value: number;
                        /** @enum {string} */
                        nature: "data" | "regime" | "definition" | "physical";
                        closed?: boolean;
                        reach?: number;
                        beyond?: string[];
                    };
                    hi?: {
                        value: number;
                        /** @enum {string} */
                        nature: "data" | "regime" | "definition" | "physical";
                        closed?: boolean;
                        reach?: number;
                        beyond?: string[];
                    };
                }[];
                /** @enum {string} */
                basis: "stated" | "handbook" | "common-practice" | "none";
                place?: string;
                note?: string;
            }[];
            expression?: string;
            pieces?: {
                title?: string;
                when: {
                    on: string;
                    lo?: number;
                    hi?: number;
                    loClosed?: boolean;
                    hiClosed?: boolean;
                }[];
                expression: string;
            }[];
            dimensional?: boolean;
            accuracy: {
                valuePercent: number | null;
                /** @enum {string} */
                statistic: "max" | "mean" | "rms" | "95 %" | "not-stated";
                of?: string;
                text: string;
            } | null;
            cautions: string[];
            sources: {
                csl: {
                    type: string;
                    title?: string;
                    author?: {
                        family?: string;
                        given?: string;
                        literal?: string;
                    }[];
                    issued?: {
                        "date-parts": (number | string)[][];
                    };
                    "container-title"?: string;
                    publisher?: string;
                    edition?: string | number;
                    volume?: string | number;
                    issue?: string | number;
                    page?: string;
                    DOI?: string;
                } & {
                    [key: string]: unknown;
                };
                place: string;
                gives?: string;
                /** @enum {string} */
                read: "seen" | "memory";
            }[];
            checks: {
                title: string;
                /** @enum {string} */
                kind: "published" | "computed";
                source?: string;
                inputs: {
                    [key: string]: {
                        value: number;
                        unit?: string;
                    };
                };
                rows?: {
                    [key: string]: string;
                };
                equations?: {
                    [key: string]: string;
                };
                expected: {
                    [key: string]: {
                        value: number;
                        unit?: string;
                    };
                };
                tolerancePercent: number;
                note?: string;
            }[];
            verification: {
                /** @enum {string} */
                status: "published-example" | "expression-seen" | "from-memory";
                note: string;
            };
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
    health: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["HealthResponse"];
                };
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listPeople: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["PeopleResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission people.list */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    changePerson: {
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
                "application/json": components["schemas"]["PersonChangeDto"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ManagedPerson"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission people.manage */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such person */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Roles that exclude each other, or no administrator left */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    deactivatePerson: {
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
                "application/json": components["schemas"]["ReasonDto"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ManagedPerson"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission people.manage */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such person */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Inactive already, or the only administrator */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    reactivatePerson: {
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
                "application/json": components["schemas"]["ReasonDto"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ManagedPerson"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission people.manage */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such person */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Active already */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listJournal: {
        parameters: {
            query?: {
                /** @description nextCursor of the page before */
                cursor?: string;
                /** @description 1 to 200; 50 when left out */
                limit?: string;
                /** @description Only what was done to this, such as correlations/some-slug */
                subject?: string;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["JournalResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission journal.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    verifyJournal: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["VerificationResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission journal.verify */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listCheckpoints: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["CheckpointsResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission journal.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listOutbox: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["OutboxResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission mail.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
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
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SessionResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
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
                "application/json": components["schemas"]["SignInDto"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SessionResponse"];
                };
            };
            /** @description The address or the password is not right */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Too many attempts failed */
            429: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
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
            204: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listDemoPeople: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["DemoPeopleResponse"];
                };
            };
            /** @description Not a demo office */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listSessions: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SessionsResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    endSession: {
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
            204: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The caller has no such session */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description It is the one in use */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    changePassword: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["PasswordChangeDto"];
            };
        };
        responses: {
            204: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The new password cannot be taken */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The present password is not right */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getSettings: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SettingsResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission settings.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    changeSettings: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["SettingsDto"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["SettingsResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission settings.change */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The person named cannot be the principal */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    invitePerson: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["InvitationDto"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ManagedPerson"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission people.manage */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The address is taken, or the roles cannot be given */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getInvitation: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                token: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["InvitationResponse"];
                };
            };
            /** @description The link does not hold, or not any more */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    acceptInvitation: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                token: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["AcceptanceDto"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["JoinedResponse"];
                };
            };
            /** @description The password cannot be taken */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The link does not hold, or not any more */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    askForPassword: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ResetRequestDto"];
            };
        };
        responses: {
            202: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ResetAskedResponse"];
                };
            };
            /** @description Asked too often */
            429: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    resetPassword: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                token: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ResetDto"];
            };
        };
        responses: {
            204: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The password cannot be taken */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The link does not hold, or not any more */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listNotices: {
        parameters: {
            query?: {
                /** @description nextCursor of the page before */
                cursor?: string;
                /** @description 1 to 200; 50 when left out */
                limit?: string;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["NoticesResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getNoticePreferences: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["NoticeChoices"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    setNoticePreferences: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["NoticeChoicesDto"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["NoticeChoices"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    readNotice: {
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
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["NoticeItem"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The caller has no such notice */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listAppointments: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["AppointmentsResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission appointment.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    proposeAppointment: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ProposalDto"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["AppointmentItem"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission appointment.propose */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The person cannot be a technical authority */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    confirmAppointment: {
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
                "application/json": components["schemas"]["ConfirmationDto"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["AppointmentItem"];
                };
            };
            /** @description Neither of the two, not a second person, or the wrong password */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such appointment */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Confirmed or ended already */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    endAppointment: {
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
                "application/json": components["schemas"]["EndDto"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["AppointmentItem"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission appointment.end */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such appointment */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description It has ended */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listGeometries: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["GeometriesResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listPropertyEquations: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["PropertyEquationsResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getPropertyEquation: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["PropertyEquationSheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is none of this name */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    compareRevisions: {
        parameters: {
            query: {
                from: number;
                to: number;
            };
            header?: never;
            path: {
                slug: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["DifferencesResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is none of this name and number that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listCorrelations: {
        parameters: {
            query?: {
                /** @description Words; each must occur, the last may be begun */
                q?: string;
                geometry?: string;
                /** @description `gas` and `liquid` also find sheets that serve both */
                phase?: "gas" | "liquid" | "gas-or-liquid" | "gas-and-liquid";
                standing?: "draft" | "in review" | "approved" | "suspended" | "superseded" | "withdrawn" | "declined";
                /** @description `nextCursor` of the page before */
                cursor?: string;
                limit?: number;
            };
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["CorrelationPage"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    createCorrelation: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["NewCorrelationBody"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description The definition does not hold; each fault with its path */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.draft */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The slug is taken */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getCorrelation: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is none of this name that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    createRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["DefinitionBody"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.draft */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Another revision is still being worked on */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is none that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    editRevision: {
        parameters: {
            query?: never;
            header: {
                /** @description Hash of the content that was edited, in quotes */
                "If-Match": string;
            };
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["DefinitionBody"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.draft */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The content was changed in the meantime, or can no longer be */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    submitRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["SubmissionBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.submit */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The machine found errors: named in `fields`, whole in `inspection` */
            422: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    putRevisionForward: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["NoteBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.submit */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The machine found errors */
            422: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    takeReview: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.review */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    reviewRevision: {
        parameters: {
            query?: never;
            header?: {
                /** @description Hash of the content that was read, in quotes */
                "If-Match"?: string;
            };
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ReviewBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.review */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    approveRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ApprovalBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.approve */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    declineRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ReasonBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.approve */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    suspendRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["SuspensionBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.suspend */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    reinstateRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ReasonBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.suspend */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    withdrawRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["WithdrawalBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.withdraw */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    commentOnRevision: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["CommentBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.comment */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    answerComment: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
                id: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["TextBody"];
            };
        };
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.comment */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    resolveComment: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
                id: number;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description The sheet as it stands now */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.comment */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision's standing or content does not allow it */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getReview: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ReviewPage"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listProblemReports: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ProblemReportsResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is none of this name that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    fileProblemReport: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ProblemReportBody"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ProblemReport"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission problem-report.file */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision was never approved: it takes comments instead */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    answerProblemReport: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                id: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ProblemReportAnswerBody"];
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ProblemReport"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission problem-report.answer */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description It was answered already */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    listAttachments: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["AttachmentsResponse"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    addAttachment: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "multipart/form-data": {
                    /** Format: binary */
                    file: Blob;
                    /** @description Index of the source that the document is of */
                    source: string;
                    /** @enum {string} */
                    licence: "may-leave" | "office-only";
                };
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["AttachmentItem"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission attachment.add */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The document is attached already */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The file is larger than 15 MB */
            413: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The file is no whole PDF, PNG or JPEG, or is more than that */
            415: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    downloadAttachment: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
                id: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/pdf": Blob;
                    "image/png": Blob;
                    "image/jpeg": Blob;
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such document that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    setAttachmentLicence: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
                id: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["LicenceBody"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["AttachmentItem"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission attachment.add */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such document that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    findCandidates: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["CandidatesBody"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["CandidatesResponse"];
                };
            };
            /** @description A name, a unit or a value cannot be used */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.evaluate */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    readCitations: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["ReadingBody"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ReadingResponse"];
                };
            };
            /** @description The text cannot be taken as references; the reason with its line */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.submit */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    exportCitations: {
        parameters: {
            query?: {
                format?: "bibtex" | "ris" | "csl-json";
            };
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/x-bibtex": Blob;
                    "application/x-research-info-systems": Blob;
                    "application/vnd.citationstyles.csl+json": Blob;
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getDesk: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Desk"];
                };
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    evaluateCorrelation: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": components["schemas"]["EvaluationBody"];
            };
        };
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["WithinEvaluation"] | components["schemas"]["UncheckedEvaluation"] | components["schemas"]["DeviatingEvaluation"];
                };
            };
            /** @description Inputs are missing, unknown, over-determined or in a wrong unit */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.evaluate */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The revision is not in use */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Outside a bound: findings, and sheets to turn to. No number */
            422: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getEvaluation: {
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
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["KeptEvaluation"];
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is none of this id among those the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    getSheetSchema: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        [key: string]: unknown;
                    };
                };
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    downloadSheet: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                slug: string;
                number: number;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        [key: string]: unknown;
                    };
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.read */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description There is no such revision that the caller may see */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    uploadSheet: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "multipart/form-data": {
                    /** Format: binary */
                    file?: Blob;
                };
                "application/json": {
                    /** Format: binary */
                    file?: Blob;
                };
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["Sheet"];
                };
            };
            /** @description The file does not hold; each fault with its path */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission correlation.draft */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Another revision is still being worked on, or the slug is taken */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The file is larger than 1 MB */
            413: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    exportRegister: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        [key: string]: unknown;
                    };
                };
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.export */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
    importRegister: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "multipart/form-data": {
                    /** Format: binary */
                    file?: Blob;
                };
                "application/json": {
                    /** Format: binary */
                    file?: Blob;
                };
            };
        };
        responses: {
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": components["schemas"]["ImportedRegister"];
                };
            };
            /** @description The file does not hold; each fault with its path */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Not signed in */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Needs the permission register.import */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description This register is not empty */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description The file is larger than 128 MB */
            413: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Refused: a problem (RFC 9457) with its code, and the fields or findings concerned */
            default: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": components["schemas"]["ProblemResponse"];
                };
            };
        };
    };
}
