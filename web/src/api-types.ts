export interface paths {
    "/api/me": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["AuthController_me"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/owner": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post: operations["AuthController_owner"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/invitations": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post: operations["AuthController_invitation"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/health": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["HealthController_health"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["ProjectsController_list"];
        put?: never;
        post: operations["ProjectsController_create"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["ProjectsController_detail"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch: operations["ProjectsController_rename"];
        trace?: never;
    };
    "/api/projects/{projectId}/members": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post: operations["ProjectsController_addMember"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/members/{userId}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post?: never;
        delete: operations["ProjectsController_removeMember"];
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["RevisionsController_list"];
        put?: never;
        post: operations["RevisionsController_create"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["RevisionsController_one"];
        put?: never;
        post?: never;
        delete: operations["RevisionsController_remove"];
        options?: never;
        head?: never;
        patch: operations["RevisionsController_rename"];
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}/building": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["RevisionsController_building"];
        put: operations["RevisionsController_save"];
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}/issue": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post: operations["RevisionsController_issue"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}/analysis": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["AnalysesController_analysis"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}/demands": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["AnalysesController_demands"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}/trace": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["AnalysesController_trace"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}/working": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["AnalysesController_working"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}/foundation": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["FoundationController_demands"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/revisions/{revisionId}/foundation.csv": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["FoundationController_csv"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/compare": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["ComparisonsController_compare"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/history": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["HistoryController_of"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/projects/{projectId}/audit": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["AuditController_page"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/auth/sign-in/email": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post: operations["signIn"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/auth/sign-out": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get?: never;
        put?: never;
        post: operations["signOut"];
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/auth/get-session": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["session"];
        put?: never;
        post?: never;
        delete?: never;
        options?: never;
        head?: never;
        patch?: never;
        trace?: never;
    };
    "/api/openapi.json": {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        get: operations["openapi"];
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
    schemas: never;
    responses: never;
    parameters: never;
    requestBodies: never;
    headers: never;
    pathItems: never;
}
export type $defs = Record<string, never>;
export interface operations {
    AuthController_me: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        id: string;
                        name: string;
                        email: string;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    AuthController_owner: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    token: string;
                    name: string;
                    /** Format: email */
                    email: string;
                    password: string;
                };
            };
        };
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        ok: true;
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            410: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            422: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    AuthController_invitation: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    token: string;
                    name: string;
                    password: string;
                };
            };
        };
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        ok: true;
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            410: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            422: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    HealthController_health: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        status: "ok";
                        /** @constant */
                        database: "ok";
                        version: string;
                    };
                };
            };
            /** @description Problem */
            503: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    ProjectsController_list: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        name: string;
                        /** @enum {string} */
                        role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                        /** Format: date-time */
                        updatedAt: string;
                        latest: {
                            /** Format: uuid */
                            id: string;
                            number: number;
                            name: string;
                            /** @enum {string} */
                            state: "draft" | "issued";
                        } | null;
                    }[];
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    ProjectsController_create: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    name: string;
                };
            };
        };
        responses: {
            /** @description Done */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        name: string;
                        /** @enum {string} */
                        role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                        version: number;
                        members: {
                            userId: string;
                            name: string;
                            email: string;
                            /** @enum {string} */
                            role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                        }[];
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    ProjectsController_detail: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        name: string;
                        /** @enum {string} */
                        role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                        version: number;
                        members: {
                            userId: string;
                            name: string;
                            email: string;
                            /** @enum {string} */
                            role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                        }[];
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    ProjectsController_rename: {
        parameters: {
            query?: never;
            header: {
                /** @description The ETag that the caller saw */
                "If-Match": string;
            };
            path: {
                projectId: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    name: string;
                };
            };
        };
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        name: string;
                        /** @enum {string} */
                        role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                        version: number;
                        members: {
                            userId: string;
                            name: string;
                            email: string;
                            /** @enum {string} */
                            role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                        }[];
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            412: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            428: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    ProjectsController_addMember: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    /** Format: email */
                    email: string;
                    /** @enum {string} */
                    role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                };
            };
        };
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        member: {
                            userId: string;
                            name: string;
                            email: string;
                            /** @enum {string} */
                            role: "owner" | "engineer" | "checker" | "foundation-designer" | "reader";
                        } | null;
                        /** @description A one-time token for somebody without an account */
                        invitation: string | null;
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    ProjectsController_removeMember: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
                userId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            204: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    RevisionsController_list: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        number: number;
                        name: string;
                        /** @enum {string} */
                        state: "draft" | "issued";
                        /** @description SHA-256 of the building’s canonical text, RFC 8785 */
                        hash: string;
                        version: number;
                        basedOn: string | null;
                        /** Format: date-time */
                        createdAt: string;
                        createdBy: string;
                        /** Format: date-time */
                        updatedAt: string;
                        issuedAt: string | null;
                        purpose: string | null;
                        remarks: string | null;
                        summary: {
                            findings: {
                                note: number;
                                warning: number;
                                openEnd: number;
                            };
                            worstResidual: number;
                            levels: number;
                            wallLines: number;
                        };
                    }[];
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    RevisionsController_create: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    name: string;
                    /** Format: uuid */
                    from?: string;
                    building?: unknown;
                };
            };
        };
        responses: {
            /** @description Done */
            201: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        number: number;
                        name: string;
                        /** @enum {string} */
                        state: "draft" | "issued";
                        /** @description SHA-256 of the building’s canonical text, RFC 8785 */
                        hash: string;
                        version: number;
                        basedOn: string | null;
                        /** Format: date-time */
                        createdAt: string;
                        createdBy: string;
                        /** Format: date-time */
                        updatedAt: string;
                        issuedAt: string | null;
                        purpose: string | null;
                        remarks: string | null;
                        summary: {
                            findings: {
                                note: number;
                                warning: number;
                                openEnd: number;
                            };
                            worstResidual: number;
                            levels: number;
                            wallLines: number;
                        };
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            413: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            422: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    RevisionsController_one: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        number: number;
                        name: string;
                        /** @enum {string} */
                        state: "draft" | "issued";
                        /** @description SHA-256 of the building’s canonical text, RFC 8785 */
                        hash: string;
                        version: number;
                        basedOn: string | null;
                        /** Format: date-time */
                        createdAt: string;
                        createdBy: string;
                        /** Format: date-time */
                        updatedAt: string;
                        issuedAt: string | null;
                        purpose: string | null;
                        remarks: string | null;
                        summary: {
                            findings: {
                                note: number;
                                warning: number;
                                openEnd: number;
                            };
                            worstResidual: number;
                            levels: number;
                            wallLines: number;
                        };
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    RevisionsController_remove: {
        parameters: {
            query?: never;
            header: {
                /** @description The ETag that the caller saw */
                "If-Match": string;
            };
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            204: {
                headers: {
                    [name: string]: unknown;
                };
                content?: never;
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            412: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            428: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    RevisionsController_rename: {
        parameters: {
            query?: never;
            header: {
                /** @description The ETag that the caller saw */
                "If-Match": string;
            };
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    name: string;
                };
            };
        };
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        number: number;
                        name: string;
                        /** @enum {string} */
                        state: "draft" | "issued";
                        /** @description SHA-256 of the building’s canonical text, RFC 8785 */
                        hash: string;
                        version: number;
                        basedOn: string | null;
                        /** Format: date-time */
                        createdAt: string;
                        createdBy: string;
                        /** Format: date-time */
                        updatedAt: string;
                        issuedAt: string | null;
                        purpose: string | null;
                        remarks: string | null;
                        summary: {
                            findings: {
                                note: number;
                                warning: number;
                                openEnd: number;
                            };
                            worstResidual: number;
                            levels: number;
                            wallLines: number;
                        };
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            412: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            428: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    RevisionsController_building: {
        parameters: {
            query?: {
                download?: "1";
            };
            header?: never;
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        schema: "groundward.building/1";
                        name: string;
                        /** @description Every number in the file and in its results is in these units and their products. */
                        units: {
                            /** @constant */
                            length: "ft";
                            /** @constant */
                            force: "kip";
                        } | {
                            /** @constant */
                            length: "m";
                            /** @constant */
                            force: "kN";
                        };
                        levels: {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /** @description [length]; the lowest level is the base */
                            elevation: number;
                            diaphragms?: {
                                /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                id: string;
                                name?: string;
                                /** @description Simple polygon without a repeated last point, in either direction [length] */
                                outline: [
                                    number,
                                    number
                                ][];
                                openings?: {
                                    /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                    id: string;
                                    name?: string;
                                    /** @description Simple polygon without a repeated last point, in either direction [length] */
                                    outline: [
                                        number,
                                        number
                                    ][];
                                }[];
                                /**
                                 * @description Default flexible
                                 * @enum {string}
                                 */
                                behaviour?: "flexible" | "rigid" | "semi-rigid" | "envelope";
                                /** @description A diaphragm assembly */
                                assembly?: string;
                                /** @description Largest side of a finite element of a semi-rigid diaphragm [length]; default a sixteenth of the side of a square of its area */
                                meshSize?: number;
                                /** @description Greatest length, across the load, over which a chord that ends at a step of the outline or at an opening gives its force to the floor beside it [length]; default up to the next wall line or step, beyond the sides of an opening half the floor’s depth */
                                transferLength?: number;
                                weight?: {
                                    /** @description Seismic weight of floor or roof [force/length²]; default 0 */
                                    area?: number;
                                    /** @description Characteristic live load, of which the seismic mass of EN 1998-1 takes the part ψ_E [force/length²]; default 0 */
                                    live?: number;
                                    zones?: {
                                        /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                        id: string;
                                        name?: string;
                                        /** @description Simple polygon without a repeated last point, in either direction [length] */
                                        outline: [
                                            number,
                                            number
                                        ][];
                                        /** @description Replaces the diaphragm’s own area weight inside the outline [force/length²] */
                                        area: number;
                                        /** @description Live load inside the outline [force/length²]; default the diaphragm’s own */
                                        live?: number;
                                    }[];
                                    /** @description Façades and partitions, added to area weights */
                                    lines?: {
                                        /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                        id: string;
                                        name?: string;
                                        /** @description Trace of a façade or partition on plan [length] */
                                        along: [
                                            number,
                                            number
                                        ][];
                                        /** @description [force/length] */
                                        perLength: number;
                                    }[];
                                };
                            }[];
                        }[];
                        wallLines: {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /** @description Trace of the wall line’s vertical plane on plan */
                            axis: [
                                [
                                    number,
                                    number
                                ],
                                [
                                    number,
                                    number
                                ]
                            ];
                            /**
                             * @description How the line’s force goes to its piers; default length
                             * @enum {string}
                             */
                            shareBy?: "length" | "stiffness" | "deflection";
                            /** @description Where a collector runs over less than the whole cut of the diaphragm at the line */
                            collectors?: {
                                /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                level: string;
                                /** @description Distance along the axis [length] */
                                from: number;
                                to: number;
                            }[];
                            storeys: {
                                /** @description The level which this storey of the wall line holds */
                                under: string;
                                piers: {
                                    /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                    id: string;
                                    name?: string;
                                    /** @description Distance along the wall line’s axis to the near end [length] */
                                    from: number;
                                    /** @description Distance along the wall line’s axis to the far end [length] */
                                    to: number;
                                    /** @description A wall assembly */
                                    assembly?: string;
                                    /** @description A hold-down assembly, at both ends */
                                    holdDown?: string;
                                    /** @description Lateral stiffness along the line [force/length] */
                                    stiffness?: number;
                                    /** @description Distance of the end posts from the pier’s ends, one number or [near, far] [length]; default 0 */
                                    endOffset?: number | [
                                        number,
                                        number
                                    ];
                                    gravity?: {
                                        /**
                                         * @description D dead, L live, Lr roof live, S snow: unfactored components of gravity load
                                         * @enum {string}
                                         */
                                        case: "D" | "L" | "Lr" | "S";
                                        /** @description Gravity load on top of the pier, evenly along it [force/length] */
                                        perLength: number;
                                    }[];
                                }[];
                            }[];
                        }[];
                        assemblies?: {
                            diaphragms?: {
                                /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                id: string;
                                name?: string;
                                /**
                                 * @description Blocked panels with nominal unit shears after SDPWS-2015 Table 4.2A (values from memory, not checked against the document); stated values go before; default none
                                 * @enum {string}
                                 */
                                published?: "blocked-15-32-8d-6in-2x" | "blocked-15-32-8d-4in-2x" | "blocked-15-32-8d-2.5in-2x" | "blocked-15-32-8d-2in-2x" | "blocked-15-32-8d-6in-3x" | "blocked-15-32-8d-4in-3x" | "blocked-15-32-8d-2.5in-3x" | "blocked-15-32-8d-2in-3x" | "blocked-15-32-10d-6in-2x" | "blocked-15-32-10d-4in-2x" | "blocked-15-32-10d-2.5in-2x" | "blocked-15-32-10d-2in-2x" | "blocked-15-32-10d-6in-3x" | "blocked-15-32-10d-4in-3x" | "blocked-15-32-10d-2.5in-3x" | "blocked-15-32-10d-2in-3x";
                                /** @description [force/length]; default that of the published assembly */
                                nominalUnitShear?: {
                                    /** @description v_s [force/length] */
                                    seismic?: number;
                                    /** @description v_w [force/length] */
                                    wind?: number;
                                };
                                /**
                                 * @description Edition of SDPWS whose reduction of nominal unit shears applies; default 2015
                                 * @enum {string}
                                 */
                                edition?: "2015" | "2021";
                                /**
                                 * @description Reduction where the combinations are a list of the file’s own, or none; a published set brings its own; default allowable
                                 * @enum {string}
                                 */
                                format?: "allowable" | "strength";
                                /** @description Of the framing; below 0.50 the nominal unit shear is multiplied by 1 − (0.5 − G); default 0.50 */
                                specificGravity?: number;
                                /** @description Gₐ [force/length] */
                                apparentShearStiffness?: number;
                                /** @description E·A of the chords along outline and openings of a semi-rigid diaphragm [force]; default none */
                                chordStiffness?: number;
                                /** @description Axial stiffness of the floor per unit width of a semi-rigid diaphragm [force/length]; default 2 Gₐ with stated chords, else 1000 Gₐ: no bending */
                                axialStiffness?: number;
                            }[];
                            walls?: {
                                /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                id: string;
                                name?: string;
                                /**
                                 * @description Blocked panels on one side, by grade, thickness [in], nail, edge spacing and panel, with nominal unit shears and Gₐ of SDPWS-2015 Table 4.3A; stated values go before; default none
                                 * @enum {string}
                                 */
                                published?: "structural-1-5-16-6d-6in-osb" | "structural-1-5-16-6d-6in-plywood" | "structural-1-5-16-6d-4in-osb" | "structural-1-5-16-6d-4in-plywood" | "structural-1-5-16-6d-3in-osb" | "structural-1-5-16-6d-3in-plywood" | "structural-1-5-16-6d-2in-osb" | "structural-1-5-16-6d-2in-plywood" | "structural-1-3-8-8d-6in-osb" | "structural-1-3-8-8d-6in-plywood" | "structural-1-3-8-8d-4in-osb" | "structural-1-3-8-8d-4in-plywood" | "structural-1-3-8-8d-3in-osb" | "structural-1-3-8-8d-3in-plywood" | "structural-1-3-8-8d-2in-osb" | "structural-1-3-8-8d-2in-plywood" | "structural-1-7-16-8d-6in-osb" | "structural-1-7-16-8d-6in-plywood" | "structural-1-7-16-8d-4in-osb" | "structural-1-7-16-8d-4in-plywood" | "structural-1-7-16-8d-3in-osb" | "structural-1-7-16-8d-3in-plywood" | "structural-1-7-16-8d-2in-osb" | "structural-1-7-16-8d-2in-plywood" | "structural-1-15-32-8d-6in-osb" | "structural-1-15-32-8d-6in-plywood" | "structural-1-15-32-8d-4in-osb" | "structural-1-15-32-8d-4in-plywood" | "structural-1-15-32-8d-3in-osb" | "structural-1-15-32-8d-3in-plywood" | "structural-1-15-32-8d-2in-osb" | "structural-1-15-32-8d-2in-plywood" | "structural-1-15-32-10d-6in-osb" | "structural-1-15-32-10d-6in-plywood" | "structural-1-15-32-10d-4in-osb" | "structural-1-15-32-10d-4in-plywood" | "structural-1-15-32-10d-3in-osb" | "structural-1-15-32-10d-3in-plywood" | "structural-1-15-32-10d-2in-osb" | "structural-1-15-32-10d-2in-plywood" | "sheathing-5-16-6d-6in-osb" | "sheathing-5-16-6d-6in-plywood" | "sheathing-5-16-6d-4in-osb" | "sheathing-5-16-6d-4in-plywood" | "sheathing-5-16-6d-3in-osb" | "sheathing-5-16-6d-3in-plywood" | "sheathing-5-16-6d-2in-osb" | "sheathing-5-16-6d-2in-plywood" | "sheathing-3-8-6d-6in-osb" | "sheathing-3-8-6d-6in-plywood" | "sheathing-3-8-6d-4in-osb" | "sheathing-3-8-6d-4in-plywood" | "sheathing-3-8-6d-3in-osb" | "sheathing-3-8-6d-3in-plywood" | "sheathing-3-8-6d-2in-osb" | "sheathing-3-8-6d-2in-plywood" | "sheathing-3-8-8d-6in-osb" | "sheathing-3-8-8d-6in-plywood" | "sheathing-3-8-8d-4in-osb" | "sheathing-3-8-8d-4in-plywood" | "sheathing-3-8-8d-3in-osb" | "sheathing-3-8-8d-3in-plywood" | "sheathing-3-8-8d-2in-osb" | "sheathing-3-8-8d-2in-plywood" | "sheathing-7-16-8d-6in-osb" | "sheathing-7-16-8d-6in-plywood" | "sheathing-7-16-8d-4in-osb" | "sheathing-7-16-8d-4in-plywood" | "sheathing-7-16-8d-3in-osb" | "sheathing-7-16-8d-3in-plywood" | "sheathing-7-16-8d-2in-osb" | "sheathing-7-16-8d-2in-plywood" | "sheathing-15-32-8d-6in-osb" | "sheathing-15-32-8d-6in-plywood" | "sheathing-15-32-8d-4in-osb" | "sheathing-15-32-8d-4in-plywood" | "sheathing-15-32-8d-3in-osb" | "sheathing-15-32-8d-3in-plywood" | "sheathing-15-32-8d-2in-osb" | "sheathing-15-32-8d-2in-plywood" | "sheathing-15-32-10d-6in-osb" | "sheathing-15-32-10d-6in-plywood" | "sheathing-15-32-10d-4in-osb" | "sheathing-15-32-10d-4in-plywood" | "sheathing-15-32-10d-3in-osb" | "sheathing-15-32-10d-3in-plywood" | "sheathing-15-32-10d-2in-osb" | "sheathing-15-32-10d-2in-plywood" | "sheathing-19-32-10d-6in-osb" | "sheathing-19-32-10d-6in-plywood" | "sheathing-19-32-10d-4in-osb" | "sheathing-19-32-10d-4in-plywood" | "sheathing-19-32-10d-3in-osb" | "sheathing-19-32-10d-3in-plywood" | "sheathing-19-32-10d-2in-osb" | "sheathing-19-32-10d-2in-plywood";
                                /** @description [force/length]; default that of the published assembly */
                                nominalUnitShear?: {
                                    /** @description v_s [force/length] */
                                    seismic?: number;
                                    /** @description v_w [force/length] */
                                    wind?: number;
                                };
                                /**
                                 * @description Edition of SDPWS whose reduction of nominal unit shears applies; default 2015
                                 * @enum {string}
                                 */
                                edition?: "2015" | "2021";
                                /**
                                 * @description Reduction where the combinations are a list of the file’s own, or none; a published set brings its own; default allowable
                                 * @enum {string}
                                 */
                                format?: "allowable" | "strength";
                                /** @description Of the framing; below 0.50 the nominal unit shear is multiplied by 1 − (0.5 − G); default 0.50 */
                                specificGravity?: number;
                                /** @description Gₐ [force/length]; default that of the published assembly */
                                apparentShearStiffness?: number;
                                /** @description E·A of one end post [force], for the bending term of the deflection; default none: end posts do not change their length */
                                endPostStiffness?: number;
                                /** @description Deflects by the four-term equation with the slip of its nails; default the three-term equation with Gₐ */
                                fourTerm?: {
                                    /** @description G_v·t_v through the thickness of the panel [force/length] */
                                    panelRigidity: number;
                                    /** @enum {string} */
                                    nail: "6d" | "8d" | "10d";
                                    /** @description Spacing of the nails at panel edges [length] */
                                    edgeSpacing: number;
                                    /**
                                     * @description Grade of the panel; default sheathing
                                     * @enum {string}
                                     */
                                    grade?: "structural-1" | "sheathing";
                                };
                                /**
                                 * @description For the limit of height over length and the factor of slender piers; other: neither; default panels-blocked
                                 * @enum {string}
                                 */
                                sheathing?: "panels-blocked" | "panels-unblocked" | "plaster" | "gypsum" | "other";
                            }[];
                            holdDowns?: {
                                /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                id: string;
                                name?: string;
                                /** @description Against allowable combinations [force] */
                                allowableTension?: number;
                                /** @description Against strength combinations [force] */
                                strengthTension?: number;
                                /** @description Vertical elongation of the hold-down system at the allowable tension, for the rotation term of the deflection [length]; default none: it does not give */
                                deflectionAtAllowable?: number;
                            }[];
                        };
                        /** @description Basis of design of every load case that names none */
                        basis?: {
                            /** @constant */
                            standard: "ASCE 7-16";
                            seismic?: {
                                SDS: number;
                                SD1: number;
                                /** @description Default 0: the limit for S1 ≥ 0.6 does not apply */
                                S1?: number;
                                /** @description Long-period transition [s]; default 8 */
                                TL?: number;
                                R: number;
                                /** @description Ω₀; default 1 */
                                overstrength?: number;
                                /** @description Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false */
                                reduceOverstrength?: boolean;
                                /** @description Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false */
                                lightFrame?: boolean;
                                /** @description Default R */
                                Cd?: number;
                                /** @description Iₑ; default 1 */
                                importance?: number;
                                /** @description ρ; default 1 */
                                redundancy?: number;
                                /**
                                 * @description Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated
                                 * @enum {string}
                                 */
                                redundancyRule?: "stated" | "determined";
                                /**
                                 * @description Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated
                                 * @enum {string}
                                 */
                                accidentalTorsion?: "stated" | "required";
                                /** @description Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false */
                                shortPeriodCap?: boolean;
                                /**
                                 * @description Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it
                                 * @enum {string}
                                 */
                                designCategory?: "A" | "B" | "C" | "D" | "E" | "F";
                                /** @description T [s]; default the approximate period Cₜ hₙˣ */
                                period?: number;
                                /**
                                 * @description System by which Cₜ and x of the approximate period are taken; default all other
                                 * @enum {string}
                                 */
                                periodSystem?: "steel moment frames" | "concrete moment frames" | "eccentrically or buckling-restrained braced" | "all other";
                                /** @description Cₜ for hₙ in feet; default that of `periodSystem`, 0.02 */
                                Ct?: number;
                                /** @description Default that of `periodSystem`, 0.75 */
                                x?: number;
                            };
                            wind?: {
                                /** @description Basic wind speed: mi/h in a file in feet, m/s in a file in metres */
                                V: number;
                                /** @enum {string} */
                                exposure: "B" | "C" | "D";
                                /** @description Topography, the same at all heights; default 1 */
                                Kzt?: number;
                                /** @description Directionality; default 0.85 */
                                Kd?: number;
                                /** @description Ground elevation; default 1 */
                                Ke?: number;
                                /** @description Gust effect; default 0.85, the value for rigid buildings */
                                G?: number;
                                /** @description Elevation of the ground from which heights count [length]; default the lowest level */
                                ground?: number;
                                /** @description Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level */
                                roofHeight?: number;
                                /**
                                 * @description Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor
                                 * @enum {string}
                                 */
                                heightRule?: "floor" | "mean";
                                /** @description Height of the parapet on every roof [length]; default none */
                                parapet?: number;
                                /** @description Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true */
                                torsion?: boolean;
                            };
                            /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                            combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                                id: string;
                                /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                                factors: {
                                    D?: number;
                                    L?: number;
                                    Lr?: number;
                                    S?: number;
                                    E?: number;
                                    W?: number;
                                };
                            }[];
                        } | {
                            /** @constant */
                            standard: "ASCE 7-22";
                            seismic?: {
                                SDS: number;
                                SD1: number;
                                /** @description Default 0: the limit for S1 ≥ 0.6 does not apply */
                                S1?: number;
                                /** @description Long-period transition [s]; default 8 */
                                TL?: number;
                                R: number;
                                /** @description Ω₀; default 1 */
                                overstrength?: number;
                                /** @description Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false */
                                reduceOverstrength?: boolean;
                                /** @description Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false */
                                lightFrame?: boolean;
                                /** @description Default R */
                                Cd?: number;
                                /** @description Iₑ; default 1 */
                                importance?: number;
                                /** @description ρ; default 1 */
                                redundancy?: number;
                                /**
                                 * @description Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated
                                 * @enum {string}
                                 */
                                redundancyRule?: "stated" | "determined";
                                /**
                                 * @description Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated
                                 * @enum {string}
                                 */
                                accidentalTorsion?: "stated" | "required";
                                /** @description Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false */
                                shortPeriodCap?: boolean;
                                /**
                                 * @description Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it
                                 * @enum {string}
                                 */
                                designCategory?: "A" | "B" | "C" | "D" | "E" | "F";
                                /** @description T [s]; default the approximate period Cₜ hₙˣ */
                                period?: number;
                                /**
                                 * @description System by which Cₜ and x of the approximate period are taken; default all other
                                 * @enum {string}
                                 */
                                periodSystem?: "steel moment frames" | "concrete moment frames" | "eccentrically or buckling-restrained braced" | "all other";
                                /** @description Cₜ for hₙ in feet; default that of `periodSystem`, 0.02 */
                                Ct?: number;
                                /** @description Default that of `periodSystem`, 0.75 */
                                x?: number;
                            };
                            wind?: {
                                /** @description Basic wind speed: mi/h in a file in feet, m/s in a file in metres */
                                V: number;
                                /** @enum {string} */
                                exposure: "B" | "C" | "D";
                                /** @description Topography, the same at all heights; default 1 */
                                Kzt?: number;
                                /** @description Directionality; default 0.85 */
                                Kd?: number;
                                /** @description Ground elevation; default 1 */
                                Ke?: number;
                                /** @description Gust effect; default 0.85, the value for rigid buildings */
                                G?: number;
                                /** @description Elevation of the ground from which heights count [length]; default the lowest level */
                                ground?: number;
                                /** @description Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level */
                                roofHeight?: number;
                                /**
                                 * @description Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor
                                 * @enum {string}
                                 */
                                heightRule?: "floor" | "mean";
                                /** @description Height of the parapet on every roof [length]; default none */
                                parapet?: number;
                                /** @description Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true */
                                torsion?: boolean;
                            };
                            /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                            combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                                id: string;
                                /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                                factors: {
                                    D?: number;
                                    L?: number;
                                    Lr?: number;
                                    S?: number;
                                    E?: number;
                                    W?: number;
                                };
                            }[];
                        } | {
                            /** @constant */
                            standard: "EN 1998-1";
                            seismic: {
                                /** @description Reference peak ground acceleration on ground of type A, over the acceleration of gravity */
                                agR: number;
                                /** @enum {string} */
                                groundType: "A" | "B" | "C" | "D" | "E";
                                /**
                                 * @description Default type 1
                                 * @enum {string}
                                 */
                                spectrum?: "type 1" | "type 2";
                                /** @description Behaviour factor */
                                q: number;
                                /** @description γI; default 1 */
                                importance?: number;
                                /** @description T₁ [s]; default Cₜ·H^0.75 */
                                period?: number;
                                /** @description Cₜ for H in metres; default 0.05 */
                                Ct?: number;
                                /** @description λ; default 0.85 where T₁ ≤ 2·T_C and the building has more than two storeys, else 1 */
                                lambda?: number;
                                /** @description ψ_E, the part of live load that belongs to the seismic mass; default 0.3: ψ₂ of categories A and B, φ = 1 */
                                psiE?: number;
                                /** @description Lower bound of the design spectrum over a_g; default 0.2 */
                                beta?: number;
                                /** @description γd on the forces of diaphragms; default 1.3, the value for brittle failure */
                                diaphragmOverstrength?: number;
                            };
                            /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                            combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                                id: string;
                                /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                                factors: {
                                    D?: number;
                                    L?: number;
                                    Lr?: number;
                                    S?: number;
                                    E?: number;
                                    W?: number;
                                };
                            }[];
                        };
                        /** @description Further bases of design, side by side: a load case names the one that it takes; where the file has no other, the only one is every case’s */
                        bases?: ({
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /** @constant */
                            standard: "ASCE 7-16";
                            seismic?: {
                                SDS: number;
                                SD1: number;
                                /** @description Default 0: the limit for S1 ≥ 0.6 does not apply */
                                S1?: number;
                                /** @description Long-period transition [s]; default 8 */
                                TL?: number;
                                R: number;
                                /** @description Ω₀; default 1 */
                                overstrength?: number;
                                /** @description Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false */
                                reduceOverstrength?: boolean;
                                /** @description Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false */
                                lightFrame?: boolean;
                                /** @description Default R */
                                Cd?: number;
                                /** @description Iₑ; default 1 */
                                importance?: number;
                                /** @description ρ; default 1 */
                                redundancy?: number;
                                /**
                                 * @description Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated
                                 * @enum {string}
                                 */
                                redundancyRule?: "stated" | "determined";
                                /**
                                 * @description Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated
                                 * @enum {string}
                                 */
                                accidentalTorsion?: "stated" | "required";
                                /** @description Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false */
                                shortPeriodCap?: boolean;
                                /**
                                 * @description Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it
                                 * @enum {string}
                                 */
                                designCategory?: "A" | "B" | "C" | "D" | "E" | "F";
                                /** @description T [s]; default the approximate period Cₜ hₙˣ */
                                period?: number;
                                /**
                                 * @description System by which Cₜ and x of the approximate period are taken; default all other
                                 * @enum {string}
                                 */
                                periodSystem?: "steel moment frames" | "concrete moment frames" | "eccentrically or buckling-restrained braced" | "all other";
                                /** @description Cₜ for hₙ in feet; default that of `periodSystem`, 0.02 */
                                Ct?: number;
                                /** @description Default that of `periodSystem`, 0.75 */
                                x?: number;
                            };
                            wind?: {
                                /** @description Basic wind speed: mi/h in a file in feet, m/s in a file in metres */
                                V: number;
                                /** @enum {string} */
                                exposure: "B" | "C" | "D";
                                /** @description Topography, the same at all heights; default 1 */
                                Kzt?: number;
                                /** @description Directionality; default 0.85 */
                                Kd?: number;
                                /** @description Ground elevation; default 1 */
                                Ke?: number;
                                /** @description Gust effect; default 0.85, the value for rigid buildings */
                                G?: number;
                                /** @description Elevation of the ground from which heights count [length]; default the lowest level */
                                ground?: number;
                                /** @description Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level */
                                roofHeight?: number;
                                /**
                                 * @description Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor
                                 * @enum {string}
                                 */
                                heightRule?: "floor" | "mean";
                                /** @description Height of the parapet on every roof [length]; default none */
                                parapet?: number;
                                /** @description Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true */
                                torsion?: boolean;
                            };
                            /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                            combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                                id: string;
                                /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                                factors: {
                                    D?: number;
                                    L?: number;
                                    Lr?: number;
                                    S?: number;
                                    E?: number;
                                    W?: number;
                                };
                            }[];
                        } | {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /** @constant */
                            standard: "ASCE 7-22";
                            seismic?: {
                                SDS: number;
                                SD1: number;
                                /** @description Default 0: the limit for S1 ≥ 0.6 does not apply */
                                S1?: number;
                                /** @description Long-period transition [s]; default 8 */
                                TL?: number;
                                R: number;
                                /** @description Ω₀; default 1 */
                                overstrength?: number;
                                /** @description Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false */
                                reduceOverstrength?: boolean;
                                /** @description Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false */
                                lightFrame?: boolean;
                                /** @description Default R */
                                Cd?: number;
                                /** @description Iₑ; default 1 */
                                importance?: number;
                                /** @description ρ; default 1 */
                                redundancy?: number;
                                /**
                                 * @description Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated
                                 * @enum {string}
                                 */
                                redundancyRule?: "stated" | "determined";
                                /**
                                 * @description Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated
                                 * @enum {string}
                                 */
                                accidentalTorsion?: "stated" | "required";
                                /** @description Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false */
                                shortPeriodCap?: boolean;
                                /**
                                 * @description Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it
                                 * @enum {string}
                                 */
                                designCategory?: "A" | "B" | "C" | "D" | "E" | "F";
                                /** @description T [s]; default the approximate period Cₜ hₙˣ */
                                period?: number;
                                /**
                                 * @description System by which Cₜ and x of the approximate period are taken; default all other
                                 * @enum {string}
                                 */
                                periodSystem?: "steel moment frames" | "concrete moment frames" | "eccentrically or buckling-restrained braced" | "all other";
                                /** @description Cₜ for hₙ in feet; default that of `periodSystem`, 0.02 */
                                Ct?: number;
                                /** @description Default that of `periodSystem`, 0.75 */
                                x?: number;
                            };
                            wind?: {
                                /** @description Basic wind speed: mi/h in a file in feet, m/s in a file in metres */
                                V: number;
                                /** @enum {string} */
                                exposure: "B" | "C" | "D";
                                /** @description Topography, the same at all heights; default 1 */
                                Kzt?: number;
                                /** @description Directionality; default 0.85 */
                                Kd?: number;
                                /** @description Ground elevation; default 1 */
                                Ke?: number;
                                /** @description Gust effect; default 0.85, the value for rigid buildings */
                                G?: number;
                                /** @description Elevation of the ground from which heights count [length]; default the lowest level */
                                ground?: number;
                                /** @description Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level */
                                roofHeight?: number;
                                /**
                                 * @description Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor
                                 * @enum {string}
                                 */
                                heightRule?: "floor" | "mean";
                                /** @description Height of the parapet on every roof [length]; default none */
                                parapet?: number;
                                /** @description Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true */
                                torsion?: boolean;
                            };
                            /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                            combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                                id: string;
                                /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                                factors: {
                                    D?: number;
                                    L?: number;
                                    Lr?: number;
                                    S?: number;
                                    E?: number;
                                    W?: number;
                                };
                            }[];
                        } | {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /** @constant */
                            standard: "EN 1998-1";
                            seismic: {
                                /** @description Reference peak ground acceleration on ground of type A, over the acceleration of gravity */
                                agR: number;
                                /** @enum {string} */
                                groundType: "A" | "B" | "C" | "D" | "E";
                                /**
                                 * @description Default type 1
                                 * @enum {string}
                                 */
                                spectrum?: "type 1" | "type 2";
                                /** @description Behaviour factor */
                                q: number;
                                /** @description γI; default 1 */
                                importance?: number;
                                /** @description T₁ [s]; default Cₜ·H^0.75 */
                                period?: number;
                                /** @description Cₜ for H in metres; default 0.05 */
                                Ct?: number;
                                /** @description λ; default 0.85 where T₁ ≤ 2·T_C and the building has more than two storeys, else 1 */
                                lambda?: number;
                                /** @description ψ_E, the part of live load that belongs to the seismic mass; default 0.3: ψ₂ of categories A and B, φ = 1 */
                                psiE?: number;
                                /** @description Lower bound of the design spectrum over a_g; default 0.2 */
                                beta?: number;
                                /** @description γd on the forces of diaphragms; default 1.3, the value for brittle failure */
                                diaphragmOverstrength?: number;
                            };
                            /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                            combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                                id: string;
                                /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                                factors: {
                                    D?: number;
                                    L?: number;
                                    Lr?: number;
                                    S?: number;
                                    E?: number;
                                    W?: number;
                                };
                            }[];
                        })[];
                        loadCases: ({
                            id: string;
                            name?: string;
                            /** @description The basis of design of this case, one of `bases`; default the file’s `basis` */
                            basis?: string;
                            /** @description Direction in which the load acts, degrees anticlockwise from +x; both senses are run */
                            direction: number;
                            accidental?: {
                                /** @description Accidental eccentricity over the plan dimension across the load */
                                ratio: number;
                                /** @description Amplify by Aₓ where the diaphragm is torsionally irregular; default false */
                                amplified?: boolean;
                            };
                            /**
                             * @description How a level’s force lies on its diaphragms; default weight, and area where no weight is stated
                             * @enum {string}
                             */
                            spread?: "weight" | "area" | "even";
                            /** @enum {string} */
                            kind: "seismic" | "wind";
                            /** @constant */
                            from: "stated";
                            forces: {
                                /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                level: string;
                                /** @description Storey force set: for walls and all that they hand down [force] */
                                force: number;
                                /** @description Diaphragm design force; default the level’s force [force] */
                                diaphragmForce?: number;
                            }[];
                        } | {
                            id: string;
                            name?: string;
                            /** @description The basis of design of this case, one of `bases`; default the file’s `basis` */
                            basis?: string;
                            /** @description Direction in which the load acts, degrees anticlockwise from +x; both senses are run */
                            direction: number;
                            accidental?: {
                                /** @description Accidental eccentricity over the plan dimension across the load */
                                ratio: number;
                                /** @description Amplify by Aₓ where the diaphragm is torsionally irregular; default false */
                                amplified?: boolean;
                            };
                            /**
                             * @description How a level’s force lies on its diaphragms; default weight, and area where no weight is stated
                             * @enum {string}
                             */
                            spread?: "weight" | "area" | "even";
                            /**
                             * @description Wind from a basis lies along the façade and makes its torsional sub-cases itself: no spread, no accidental
                             * @enum {string}
                             */
                            kind: "seismic" | "wind";
                            /** @constant */
                            from: "basis";
                        } | {
                            id: string;
                            name?: string;
                            /** @description The basis whose combinations it enters; default that of its first part */
                            basis?: string;
                            /** @enum {string} */
                            kind: "seismic" | "wind";
                            /** @constant */
                            from: "combined";
                            parts: {
                                /** @description A load case of the file that has its own forces */
                                case: string;
                                /** @description Factor on its effects, not 0 */
                                factor: number;
                            }[];
                        })[];
                        /** @description A published set by name, or a list; default none, which leaves the unfactored components. The sets of ASCE 7-22 take S from a ground snow load of strength level, as that edition maps it. */
                        combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                            id: string;
                            /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                            factors: {
                                D?: number;
                                L?: number;
                                Lr?: number;
                                S?: number;
                                E?: number;
                                W?: number;
                            };
                        }[];
                        /** @description How far an end post may stand from the post below and still stand on it [length]; default 0.25 ft or 0.075 m */
                        postTolerance?: number;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    RevisionsController_save: {
        parameters: {
            query?: never;
            header: {
                /** @description The ETag that the caller saw */
                "If-Match": string;
            };
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    /** @constant */
                    schema: "groundward.building/1";
                    name: string;
                    /** @description Every number in the file and in its results is in these units and their products. */
                    units: {
                        /** @constant */
                        length: "ft";
                        /** @constant */
                        force: "kip";
                    } | {
                        /** @constant */
                        length: "m";
                        /** @constant */
                        force: "kN";
                    };
                    levels: {
                        /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                        id: string;
                        name?: string;
                        /** @description [length]; the lowest level is the base */
                        elevation: number;
                        diaphragms?: {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /** @description Simple polygon without a repeated last point, in either direction [length] */
                            outline: [
                                number,
                                number
                            ][];
                            openings?: {
                                /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                id: string;
                                name?: string;
                                /** @description Simple polygon without a repeated last point, in either direction [length] */
                                outline: [
                                    number,
                                    number
                                ][];
                            }[];
                            /**
                             * @description Default flexible
                             * @enum {string}
                             */
                            behaviour?: "flexible" | "rigid" | "semi-rigid" | "envelope";
                            /** @description A diaphragm assembly */
                            assembly?: string;
                            /** @description Largest side of a finite element of a semi-rigid diaphragm [length]; default a sixteenth of the side of a square of its area */
                            meshSize?: number;
                            /** @description Greatest length, across the load, over which a chord that ends at a step of the outline or at an opening gives its force to the floor beside it [length]; default up to the next wall line or step, beyond the sides of an opening half the floor’s depth */
                            transferLength?: number;
                            weight?: {
                                /** @description Seismic weight of floor or roof [force/length²]; default 0 */
                                area?: number;
                                /** @description Characteristic live load, of which the seismic mass of EN 1998-1 takes the part ψ_E [force/length²]; default 0 */
                                live?: number;
                                zones?: {
                                    /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                    id: string;
                                    name?: string;
                                    /** @description Simple polygon without a repeated last point, in either direction [length] */
                                    outline: [
                                        number,
                                        number
                                    ][];
                                    /** @description Replaces the diaphragm’s own area weight inside the outline [force/length²] */
                                    area: number;
                                    /** @description Live load inside the outline [force/length²]; default the diaphragm’s own */
                                    live?: number;
                                }[];
                                /** @description Façades and partitions, added to area weights */
                                lines?: {
                                    /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                    id: string;
                                    name?: string;
                                    /** @description Trace of a façade or partition on plan [length] */
                                    along: [
                                        number,
                                        number
                                    ][];
                                    /** @description [force/length] */
                                    perLength: number;
                                }[];
                            };
                        }[];
                    }[];
                    wallLines: {
                        /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                        id: string;
                        name?: string;
                        /** @description Trace of the wall line’s vertical plane on plan */
                        axis: [
                            [
                                number,
                                number
                            ],
                            [
                                number,
                                number
                            ]
                        ];
                        /**
                         * @description How the line’s force goes to its piers; default length
                         * @enum {string}
                         */
                        shareBy?: "length" | "stiffness" | "deflection";
                        /** @description Where a collector runs over less than the whole cut of the diaphragm at the line */
                        collectors?: {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            level: string;
                            /** @description Distance along the axis [length] */
                            from: number;
                            to: number;
                        }[];
                        storeys: {
                            /** @description The level which this storey of the wall line holds */
                            under: string;
                            piers: {
                                /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                                id: string;
                                name?: string;
                                /** @description Distance along the wall line’s axis to the near end [length] */
                                from: number;
                                /** @description Distance along the wall line’s axis to the far end [length] */
                                to: number;
                                /** @description A wall assembly */
                                assembly?: string;
                                /** @description A hold-down assembly, at both ends */
                                holdDown?: string;
                                /** @description Lateral stiffness along the line [force/length] */
                                stiffness?: number;
                                /** @description Distance of the end posts from the pier’s ends, one number or [near, far] [length]; default 0 */
                                endOffset?: number | [
                                    number,
                                    number
                                ];
                                gravity?: {
                                    /**
                                     * @description D dead, L live, Lr roof live, S snow: unfactored components of gravity load
                                     * @enum {string}
                                     */
                                    case: "D" | "L" | "Lr" | "S";
                                    /** @description Gravity load on top of the pier, evenly along it [force/length] */
                                    perLength: number;
                                }[];
                            }[];
                        }[];
                    }[];
                    assemblies?: {
                        diaphragms?: {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /**
                             * @description Blocked panels with nominal unit shears after SDPWS-2015 Table 4.2A (values from memory, not checked against the document); stated values go before; default none
                             * @enum {string}
                             */
                            published?: "blocked-15-32-8d-6in-2x" | "blocked-15-32-8d-4in-2x" | "blocked-15-32-8d-2.5in-2x" | "blocked-15-32-8d-2in-2x" | "blocked-15-32-8d-6in-3x" | "blocked-15-32-8d-4in-3x" | "blocked-15-32-8d-2.5in-3x" | "blocked-15-32-8d-2in-3x" | "blocked-15-32-10d-6in-2x" | "blocked-15-32-10d-4in-2x" | "blocked-15-32-10d-2.5in-2x" | "blocked-15-32-10d-2in-2x" | "blocked-15-32-10d-6in-3x" | "blocked-15-32-10d-4in-3x" | "blocked-15-32-10d-2.5in-3x" | "blocked-15-32-10d-2in-3x";
                            /** @description [force/length]; default that of the published assembly */
                            nominalUnitShear?: {
                                /** @description v_s [force/length] */
                                seismic?: number;
                                /** @description v_w [force/length] */
                                wind?: number;
                            };
                            /**
                             * @description Edition of SDPWS whose reduction of nominal unit shears applies; default 2015
                             * @enum {string}
                             */
                            edition?: "2015" | "2021";
                            /**
                             * @description Reduction where the combinations are a list of the file’s own, or none; a published set brings its own; default allowable
                             * @enum {string}
                             */
                            format?: "allowable" | "strength";
                            /** @description Of the framing; below 0.50 the nominal unit shear is multiplied by 1 − (0.5 − G); default 0.50 */
                            specificGravity?: number;
                            /** @description Gₐ [force/length] */
                            apparentShearStiffness?: number;
                            /** @description E·A of the chords along outline and openings of a semi-rigid diaphragm [force]; default none */
                            chordStiffness?: number;
                            /** @description Axial stiffness of the floor per unit width of a semi-rigid diaphragm [force/length]; default 2 Gₐ with stated chords, else 1000 Gₐ: no bending */
                            axialStiffness?: number;
                        }[];
                        walls?: {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /**
                             * @description Blocked panels on one side, by grade, thickness [in], nail, edge spacing and panel, with nominal unit shears and Gₐ of SDPWS-2015 Table 4.3A; stated values go before; default none
                             * @enum {string}
                             */
                            published?: "structural-1-5-16-6d-6in-osb" | "structural-1-5-16-6d-6in-plywood" | "structural-1-5-16-6d-4in-osb" | "structural-1-5-16-6d-4in-plywood" | "structural-1-5-16-6d-3in-osb" | "structural-1-5-16-6d-3in-plywood" | "structural-1-5-16-6d-2in-osb" | "structural-1-5-16-6d-2in-plywood" | "structural-1-3-8-8d-6in-osb" | "structural-1-3-8-8d-6in-plywood" | "structural-1-3-8-8d-4in-osb" | "structural-1-3-8-8d-4in-plywood" | "structural-1-3-8-8d-3in-osb" | "structural-1-3-8-8d-3in-plywood" | "structural-1-3-8-8d-2in-osb" | "structural-1-3-8-8d-2in-plywood" | "structural-1-7-16-8d-6in-osb" | "structural-1-7-16-8d-6in-plywood" | "structural-1-7-16-8d-4in-osb" | "structural-1-7-16-8d-4in-plywood" | "structural-1-7-16-8d-3in-osb" | "structural-1-7-16-8d-3in-plywood" | "structural-1-7-16-8d-2in-osb" | "structural-1-7-16-8d-2in-plywood" | "structural-1-15-32-8d-6in-osb" | "structural-1-15-32-8d-6in-plywood" | "structural-1-15-32-8d-4in-osb" | "structural-1-15-32-8d-4in-plywood" | "structural-1-15-32-8d-3in-osb" | "structural-1-15-32-8d-3in-plywood" | "structural-1-15-32-8d-2in-osb" | "structural-1-15-32-8d-2in-plywood" | "structural-1-15-32-10d-6in-osb" | "structural-1-15-32-10d-6in-plywood" | "structural-1-15-32-10d-4in-osb" | "structural-1-15-32-10d-4in-plywood" | "structural-1-15-32-10d-3in-osb" | "structural-1-15-32-10d-3in-plywood" | "structural-1-15-32-10d-2in-osb" | "structural-1-15-32-10d-2in-plywood" | "sheathing-5-16-6d-6in-osb" | "sheathing-5-16-6d-6in-plywood" | "sheathing-5-16-6d-4in-osb" | "sheathing-5-16-6d-4in-plywood" | "sheathing-5-16-6d-3in-osb" | "sheathing-5-16-6d-3in-plywood" | "sheathing-5-16-6d-2in-osb" | "sheathing-5-16-6d-2in-plywood" | "sheathing-3-8-6d-6in-osb" | "sheathing-3-8-6d-6in-plywood" | "sheathing-3-8-6d-4in-osb" | "sheathing-3-8-6d-4in-plywood" | "sheathing-3-8-6d-3in-osb" | "sheathing-3-8-6d-3in-plywood" | "sheathing-3-8-6d-2in-osb" | "sheathing-3-8-6d-2in-plywood" | "sheathing-3-8-8d-6in-osb" | "sheathing-3-8-8d-6in-plywood" | "sheathing-3-8-8d-4in-osb" | "sheathing-3-8-8d-4in-plywood" | "sheathing-3-8-8d-3in-osb" | "sheathing-3-8-8d-3in-plywood" | "sheathing-3-8-8d-2in-osb" | "sheathing-3-8-8d-2in-plywood" | "sheathing-7-16-8d-6in-osb" | "sheathing-7-16-8d-6in-plywood" | "sheathing-7-16-8d-4in-osb" | "sheathing-7-16-8d-4in-plywood" | "sheathing-7-16-8d-3in-osb" | "sheathing-7-16-8d-3in-plywood" | "sheathing-7-16-8d-2in-osb" | "sheathing-7-16-8d-2in-plywood" | "sheathing-15-32-8d-6in-osb" | "sheathing-15-32-8d-6in-plywood" | "sheathing-15-32-8d-4in-osb" | "sheathing-15-32-8d-4in-plywood" | "sheathing-15-32-8d-3in-osb" | "sheathing-15-32-8d-3in-plywood" | "sheathing-15-32-8d-2in-osb" | "sheathing-15-32-8d-2in-plywood" | "sheathing-15-32-10d-6in-osb" | "sheathing-15-32-10d-6in-plywood" | "sheathing-15-32-10d-4in-osb" | "sheathing-15-32-10d-4in-plywood" | "sheathing-15-32-10d-3in-osb" | "sheathing-15-32-10d-3in-plywood" | "sheathing-15-32-10d-2in-osb" | "sheathing-15-32-10d-2in-plywood" | "sheathing-19-32-10d-6in-osb" | "sheathing-19-32-10d-6in-plywood" | "sheathing-19-32-10d-4in-osb" | "sheathing-19-32-10d-4in-plywood" | "sheathing-19-32-10d-3in-osb" | "sheathing-19-32-10d-3in-plywood" | "sheathing-19-32-10d-2in-osb" | "sheathing-19-32-10d-2in-plywood";
                            /** @description [force/length]; default that of the published assembly */
                            nominalUnitShear?: {
                                /** @description v_s [force/length] */
                                seismic?: number;
                                /** @description v_w [force/length] */
                                wind?: number;
                            };
                            /**
                             * @description Edition of SDPWS whose reduction of nominal unit shears applies; default 2015
                             * @enum {string}
                             */
                            edition?: "2015" | "2021";
                            /**
                             * @description Reduction where the combinations are a list of the file’s own, or none; a published set brings its own; default allowable
                             * @enum {string}
                             */
                            format?: "allowable" | "strength";
                            /** @description Of the framing; below 0.50 the nominal unit shear is multiplied by 1 − (0.5 − G); default 0.50 */
                            specificGravity?: number;
                            /** @description Gₐ [force/length]; default that of the published assembly */
                            apparentShearStiffness?: number;
                            /** @description E·A of one end post [force], for the bending term of the deflection; default none: end posts do not change their length */
                            endPostStiffness?: number;
                            /** @description Deflects by the four-term equation with the slip of its nails; default the three-term equation with Gₐ */
                            fourTerm?: {
                                /** @description G_v·t_v through the thickness of the panel [force/length] */
                                panelRigidity: number;
                                /** @enum {string} */
                                nail: "6d" | "8d" | "10d";
                                /** @description Spacing of the nails at panel edges [length] */
                                edgeSpacing: number;
                                /**
                                 * @description Grade of the panel; default sheathing
                                 * @enum {string}
                                 */
                                grade?: "structural-1" | "sheathing";
                            };
                            /**
                             * @description For the limit of height over length and the factor of slender piers; other: neither; default panels-blocked
                             * @enum {string}
                             */
                            sheathing?: "panels-blocked" | "panels-unblocked" | "plaster" | "gypsum" | "other";
                        }[];
                        holdDowns?: {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            id: string;
                            name?: string;
                            /** @description Against allowable combinations [force] */
                            allowableTension?: number;
                            /** @description Against strength combinations [force] */
                            strengthTension?: number;
                            /** @description Vertical elongation of the hold-down system at the allowable tension, for the rotation term of the deflection [length]; default none: it does not give */
                            deflectionAtAllowable?: number;
                        }[];
                    };
                    /** @description Basis of design of every load case that names none */
                    basis?: {
                        /** @constant */
                        standard: "ASCE 7-16";
                        seismic?: {
                            SDS: number;
                            SD1: number;
                            /** @description Default 0: the limit for S1 ≥ 0.6 does not apply */
                            S1?: number;
                            /** @description Long-period transition [s]; default 8 */
                            TL?: number;
                            R: number;
                            /** @description Ω₀; default 1 */
                            overstrength?: number;
                            /** @description Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false */
                            reduceOverstrength?: boolean;
                            /** @description Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false */
                            lightFrame?: boolean;
                            /** @description Default R */
                            Cd?: number;
                            /** @description Iₑ; default 1 */
                            importance?: number;
                            /** @description ρ; default 1 */
                            redundancy?: number;
                            /**
                             * @description Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated
                             * @enum {string}
                             */
                            redundancyRule?: "stated" | "determined";
                            /**
                             * @description Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated
                             * @enum {string}
                             */
                            accidentalTorsion?: "stated" | "required";
                            /** @description Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false */
                            shortPeriodCap?: boolean;
                            /**
                             * @description Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it
                             * @enum {string}
                             */
                            designCategory?: "A" | "B" | "C" | "D" | "E" | "F";
                            /** @description T [s]; default the approximate period Cₜ hₙˣ */
                            period?: number;
                            /**
                             * @description System by which Cₜ and x of the approximate period are taken; default all other
                             * @enum {string}
                             */
                            periodSystem?: "steel moment frames" | "concrete moment frames" | "eccentrically or buckling-restrained braced" | "all other";
                            /** @description Cₜ for hₙ in feet; default that of `periodSystem`, 0.02 */
                            Ct?: number;
                            /** @description Default that of `periodSystem`, 0.75 */
                            x?: number;
                        };
                        wind?: {
                            /** @description Basic wind speed: mi/h in a file in feet, m/s in a file in metres */
                            V: number;
                            /** @enum {string} */
                            exposure: "B" | "C" | "D";
                            /** @description Topography, the same at all heights; default 1 */
                            Kzt?: number;
                            /** @description Directionality; default 0.85 */
                            Kd?: number;
                            /** @description Ground elevation; default 1 */
                            Ke?: number;
                            /** @description Gust effect; default 0.85, the value for rigid buildings */
                            G?: number;
                            /** @description Elevation of the ground from which heights count [length]; default the lowest level */
                            ground?: number;
                            /** @description Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level */
                            roofHeight?: number;
                            /**
                             * @description Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor
                             * @enum {string}
                             */
                            heightRule?: "floor" | "mean";
                            /** @description Height of the parapet on every roof [length]; default none */
                            parapet?: number;
                            /** @description Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true */
                            torsion?: boolean;
                        };
                        /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                        combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                            id: string;
                            /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                            factors: {
                                D?: number;
                                L?: number;
                                Lr?: number;
                                S?: number;
                                E?: number;
                                W?: number;
                            };
                        }[];
                    } | {
                        /** @constant */
                        standard: "ASCE 7-22";
                        seismic?: {
                            SDS: number;
                            SD1: number;
                            /** @description Default 0: the limit for S1 ≥ 0.6 does not apply */
                            S1?: number;
                            /** @description Long-period transition [s]; default 8 */
                            TL?: number;
                            R: number;
                            /** @description Ω₀; default 1 */
                            overstrength?: number;
                            /** @description Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false */
                            reduceOverstrength?: boolean;
                            /** @description Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false */
                            lightFrame?: boolean;
                            /** @description Default R */
                            Cd?: number;
                            /** @description Iₑ; default 1 */
                            importance?: number;
                            /** @description ρ; default 1 */
                            redundancy?: number;
                            /**
                             * @description Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated
                             * @enum {string}
                             */
                            redundancyRule?: "stated" | "determined";
                            /**
                             * @description Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated
                             * @enum {string}
                             */
                            accidentalTorsion?: "stated" | "required";
                            /** @description Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false */
                            shortPeriodCap?: boolean;
                            /**
                             * @description Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it
                             * @enum {string}
                             */
                            designCategory?: "A" | "B" | "C" | "D" | "E" | "F";
                            /** @description T [s]; default the approximate period Cₜ hₙˣ */
                            period?: number;
                            /**
                             * @description System by which Cₜ and x of the approximate period are taken; default all other
                             * @enum {string}
                             */
                            periodSystem?: "steel moment frames" | "concrete moment frames" | "eccentrically or buckling-restrained braced" | "all other";
                            /** @description Cₜ for hₙ in feet; default that of `periodSystem`, 0.02 */
                            Ct?: number;
                            /** @description Default that of `periodSystem`, 0.75 */
                            x?: number;
                        };
                        wind?: {
                            /** @description Basic wind speed: mi/h in a file in feet, m/s in a file in metres */
                            V: number;
                            /** @enum {string} */
                            exposure: "B" | "C" | "D";
                            /** @description Topography, the same at all heights; default 1 */
                            Kzt?: number;
                            /** @description Directionality; default 0.85 */
                            Kd?: number;
                            /** @description Ground elevation; default 1 */
                            Ke?: number;
                            /** @description Gust effect; default 0.85, the value for rigid buildings */
                            G?: number;
                            /** @description Elevation of the ground from which heights count [length]; default the lowest level */
                            ground?: number;
                            /** @description Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level */
                            roofHeight?: number;
                            /**
                             * @description Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor
                             * @enum {string}
                             */
                            heightRule?: "floor" | "mean";
                            /** @description Height of the parapet on every roof [length]; default none */
                            parapet?: number;
                            /** @description Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true */
                            torsion?: boolean;
                        };
                        /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                        combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                            id: string;
                            /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                            factors: {
                                D?: number;
                                L?: number;
                                Lr?: number;
                                S?: number;
                                E?: number;
                                W?: number;
                            };
                        }[];
                    } | {
                        /** @constant */
                        standard: "EN 1998-1";
                        seismic: {
                            /** @description Reference peak ground acceleration on ground of type A, over the acceleration of gravity */
                            agR: number;
                            /** @enum {string} */
                            groundType: "A" | "B" | "C" | "D" | "E";
                            /**
                             * @description Default type 1
                             * @enum {string}
                             */
                            spectrum?: "type 1" | "type 2";
                            /** @description Behaviour factor */
                            q: number;
                            /** @description γI; default 1 */
                            importance?: number;
                            /** @description T₁ [s]; default Cₜ·H^0.75 */
                            period?: number;
                            /** @description Cₜ for H in metres; default 0.05 */
                            Ct?: number;
                            /** @description λ; default 0.85 where T₁ ≤ 2·T_C and the building has more than two storeys, else 1 */
                            lambda?: number;
                            /** @description ψ_E, the part of live load that belongs to the seismic mass; default 0.3: ψ₂ of categories A and B, φ = 1 */
                            psiE?: number;
                            /** @description Lower bound of the design spectrum over a_g; default 0.2 */
                            beta?: number;
                            /** @description γd on the forces of diaphragms; default 1.3, the value for brittle failure */
                            diaphragmOverstrength?: number;
                        };
                        /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                        combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                            id: string;
                            /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                            factors: {
                                D?: number;
                                L?: number;
                                Lr?: number;
                                S?: number;
                                E?: number;
                                W?: number;
                            };
                        }[];
                    };
                    /** @description Further bases of design, side by side: a load case names the one that it takes; where the file has no other, the only one is every case’s */
                    bases?: ({
                        /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                        id: string;
                        name?: string;
                        /** @constant */
                        standard: "ASCE 7-16";
                        seismic?: {
                            SDS: number;
                            SD1: number;
                            /** @description Default 0: the limit for S1 ≥ 0.6 does not apply */
                            S1?: number;
                            /** @description Long-period transition [s]; default 8 */
                            TL?: number;
                            R: number;
                            /** @description Ω₀; default 1 */
                            overstrength?: number;
                            /** @description Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false */
                            reduceOverstrength?: boolean;
                            /** @description Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false */
                            lightFrame?: boolean;
                            /** @description Default R */
                            Cd?: number;
                            /** @description Iₑ; default 1 */
                            importance?: number;
                            /** @description ρ; default 1 */
                            redundancy?: number;
                            /**
                             * @description Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated
                             * @enum {string}
                             */
                            redundancyRule?: "stated" | "determined";
                            /**
                             * @description Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated
                             * @enum {string}
                             */
                            accidentalTorsion?: "stated" | "required";
                            /** @description Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false */
                            shortPeriodCap?: boolean;
                            /**
                             * @description Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it
                             * @enum {string}
                             */
                            designCategory?: "A" | "B" | "C" | "D" | "E" | "F";
                            /** @description T [s]; default the approximate period Cₜ hₙˣ */
                            period?: number;
                            /**
                             * @description System by which Cₜ and x of the approximate period are taken; default all other
                             * @enum {string}
                             */
                            periodSystem?: "steel moment frames" | "concrete moment frames" | "eccentrically or buckling-restrained braced" | "all other";
                            /** @description Cₜ for hₙ in feet; default that of `periodSystem`, 0.02 */
                            Ct?: number;
                            /** @description Default that of `periodSystem`, 0.75 */
                            x?: number;
                        };
                        wind?: {
                            /** @description Basic wind speed: mi/h in a file in feet, m/s in a file in metres */
                            V: number;
                            /** @enum {string} */
                            exposure: "B" | "C" | "D";
                            /** @description Topography, the same at all heights; default 1 */
                            Kzt?: number;
                            /** @description Directionality; default 0.85 */
                            Kd?: number;
                            /** @description Ground elevation; default 1 */
                            Ke?: number;
                            /** @description Gust effect; default 0.85, the value for rigid buildings */
                            G?: number;
                            /** @description Elevation of the ground from which heights count [length]; default the lowest level */
                            ground?: number;
                            /** @description Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level */
                            roofHeight?: number;
                            /**
                             * @description Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor
                             * @enum {string}
                             */
                            heightRule?: "floor" | "mean";
                            /** @description Height of the parapet on every roof [length]; default none */
                            parapet?: number;
                            /** @description Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true */
                            torsion?: boolean;
                        };
                        /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                        combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                            id: string;
                            /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                            factors: {
                                D?: number;
                                L?: number;
                                Lr?: number;
                                S?: number;
                                E?: number;
                                W?: number;
                            };
                        }[];
                    } | {
                        /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                        id: string;
                        name?: string;
                        /** @constant */
                        standard: "ASCE 7-22";
                        seismic?: {
                            SDS: number;
                            SD1: number;
                            /** @description Default 0: the limit for S1 ≥ 0.6 does not apply */
                            S1?: number;
                            /** @description Long-period transition [s]; default 8 */
                            TL?: number;
                            R: number;
                            /** @description Ω₀; default 1 */
                            overstrength?: number;
                            /** @description Take 0.5 off an Ω₀ of 2.5 or more where every diaphragm is flexible; default false */
                            reduceOverstrength?: boolean;
                            /** @description Braced by light-frame shear walls alone, whose collectors need not take Ω₀; default false */
                            lightFrame?: boolean;
                            /** @description Default R */
                            Cd?: number;
                            /** @description Iₑ; default 1 */
                            importance?: number;
                            /** @description ρ; default 1 */
                            redundancy?: number;
                            /**
                             * @description Where ρ comes from: `redundancy`, or what the loss of one wall does to each storey, in each direction; default stated
                             * @enum {string}
                             */
                            redundancyRule?: "stated" | "determined";
                            /**
                             * @description Accidental eccentricity of load cases from this basis: as each case states it, or ±5 % with amplification where a case states none and a torsional irregularity asks for it; default stated
                             * @enum {string}
                             */
                            accidentalTorsion?: "stated" | "required";
                            /** @description Cₛ from an SDS of 1, but not less than 70 % of it, with up to five storeys, T ≤ 0.5 s and ρ = 1: states that the structure is regular, of risk category I or II and not on site class E or F; default false */
                            shortPeriodCap?: boolean;
                            /**
                             * @description Seismic design category; without one no overstrength for collectors and under walls that stop, and no other rule that hangs on it
                             * @enum {string}
                             */
                            designCategory?: "A" | "B" | "C" | "D" | "E" | "F";
                            /** @description T [s]; default the approximate period Cₜ hₙˣ */
                            period?: number;
                            /**
                             * @description System by which Cₜ and x of the approximate period are taken; default all other
                             * @enum {string}
                             */
                            periodSystem?: "steel moment frames" | "concrete moment frames" | "eccentrically or buckling-restrained braced" | "all other";
                            /** @description Cₜ for hₙ in feet; default that of `periodSystem`, 0.02 */
                            Ct?: number;
                            /** @description Default that of `periodSystem`, 0.75 */
                            x?: number;
                        };
                        wind?: {
                            /** @description Basic wind speed: mi/h in a file in feet, m/s in a file in metres */
                            V: number;
                            /** @enum {string} */
                            exposure: "B" | "C" | "D";
                            /** @description Topography, the same at all heights; default 1 */
                            Kzt?: number;
                            /** @description Directionality; default 0.85 */
                            Kd?: number;
                            /** @description Ground elevation; default 1 */
                            Ke?: number;
                            /** @description Gust effect; default 0.85, the value for rigid buildings */
                            G?: number;
                            /** @description Elevation of the ground from which heights count [length]; default the lowest level */
                            ground?: number;
                            /** @description Mean roof height h above the ground, for the leeward wall [length]; default that of the highest level */
                            roofHeight?: number;
                            /**
                             * @description Height at which a floor takes K_z: its own, or the mean over the half storeys that it carries; default floor
                             * @enum {string}
                             */
                            heightRule?: "floor" | "mean";
                            /** @description Height of the parapet on every roof [length]; default none */
                            parapet?: number;
                            /** @description Run 75 % of the wind with an eccentricity of ±15 % of the width where a diaphragm is rigid; default true */
                            torsion?: boolean;
                        };
                        /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                        combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                            id: string;
                            /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                            factors: {
                                D?: number;
                                L?: number;
                                Lr?: number;
                                S?: number;
                                E?: number;
                                W?: number;
                            };
                        }[];
                    } | {
                        /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                        id: string;
                        name?: string;
                        /** @constant */
                        standard: "EN 1998-1";
                        seismic: {
                            /** @description Reference peak ground acceleration on ground of type A, over the acceleration of gravity */
                            agR: number;
                            /** @enum {string} */
                            groundType: "A" | "B" | "C" | "D" | "E";
                            /**
                             * @description Default type 1
                             * @enum {string}
                             */
                            spectrum?: "type 1" | "type 2";
                            /** @description Behaviour factor */
                            q: number;
                            /** @description γI; default 1 */
                            importance?: number;
                            /** @description T₁ [s]; default Cₜ·H^0.75 */
                            period?: number;
                            /** @description Cₜ for H in metres; default 0.05 */
                            Ct?: number;
                            /** @description λ; default 0.85 where T₁ ≤ 2·T_C and the building has more than two storeys, else 1 */
                            lambda?: number;
                            /** @description ψ_E, the part of live load that belongs to the seismic mass; default 0.3: ψ₂ of categories A and B, φ = 1 */
                            psiE?: number;
                            /** @description Lower bound of the design spectrum over a_g; default 0.2 */
                            beta?: number;
                            /** @description γd on the forces of diaphragms; default 1.3, the value for brittle failure */
                            diaphragmOverstrength?: number;
                        };
                        /** @description Combinations of the load cases that take this basis; default the file’s `combinations` */
                        combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                            id: string;
                            /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                            factors: {
                                D?: number;
                                L?: number;
                                Lr?: number;
                                S?: number;
                                E?: number;
                                W?: number;
                            };
                        }[];
                    })[];
                    loadCases: ({
                        id: string;
                        name?: string;
                        /** @description The basis of design of this case, one of `bases`; default the file’s `basis` */
                        basis?: string;
                        /** @description Direction in which the load acts, degrees anticlockwise from +x; both senses are run */
                        direction: number;
                        accidental?: {
                            /** @description Accidental eccentricity over the plan dimension across the load */
                            ratio: number;
                            /** @description Amplify by Aₓ where the diaphragm is torsionally irregular; default false */
                            amplified?: boolean;
                        };
                        /**
                         * @description How a level’s force lies on its diaphragms; default weight, and area where no weight is stated
                         * @enum {string}
                         */
                        spread?: "weight" | "area" | "even";
                        /** @enum {string} */
                        kind: "seismic" | "wind";
                        /** @constant */
                        from: "stated";
                        forces: {
                            /** @description Identity for life: goes from revision to revision with its member; unique in its collection. */
                            level: string;
                            /** @description Storey force set: for walls and all that they hand down [force] */
                            force: number;
                            /** @description Diaphragm design force; default the level’s force [force] */
                            diaphragmForce?: number;
                        }[];
                    } | {
                        id: string;
                        name?: string;
                        /** @description The basis of design of this case, one of `bases`; default the file’s `basis` */
                        basis?: string;
                        /** @description Direction in which the load acts, degrees anticlockwise from +x; both senses are run */
                        direction: number;
                        accidental?: {
                            /** @description Accidental eccentricity over the plan dimension across the load */
                            ratio: number;
                            /** @description Amplify by Aₓ where the diaphragm is torsionally irregular; default false */
                            amplified?: boolean;
                        };
                        /**
                         * @description How a level’s force lies on its diaphragms; default weight, and area where no weight is stated
                         * @enum {string}
                         */
                        spread?: "weight" | "area" | "even";
                        /**
                         * @description Wind from a basis lies along the façade and makes its torsional sub-cases itself: no spread, no accidental
                         * @enum {string}
                         */
                        kind: "seismic" | "wind";
                        /** @constant */
                        from: "basis";
                    } | {
                        id: string;
                        name?: string;
                        /** @description The basis whose combinations it enters; default that of its first part */
                        basis?: string;
                        /** @enum {string} */
                        kind: "seismic" | "wind";
                        /** @constant */
                        from: "combined";
                        parts: {
                            /** @description A load case of the file that has its own forces */
                            case: string;
                            /** @description Factor on its effects, not 0 */
                            factor: number;
                        }[];
                    })[];
                    /** @description A published set by name, or a list; default none, which leaves the unfactored components. The sets of ASCE 7-22 take S from a ground snow load of strength level, as that edition maps it. */
                    combinations?: ("ASCE 7-16 allowable" | "ASCE 7-16 strength" | "ASCE 7-22 allowable" | "ASCE 7-22 strength" | "EN 1990") | {
                        id: string;
                        /** @description Factors taken as stated: E and W multiply the load case’s own effect */
                        factors: {
                            D?: number;
                            L?: number;
                            Lr?: number;
                            S?: number;
                            E?: number;
                            W?: number;
                        };
                    }[];
                    /** @description How far an end post may stand from the post below and still stand on it [length]; default 0.25 ft or 0.075 m */
                    postTolerance?: number;
                };
            };
        };
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        number: number;
                        name: string;
                        /** @enum {string} */
                        state: "draft" | "issued";
                        /** @description SHA-256 of the building’s canonical text, RFC 8785 */
                        hash: string;
                        version: number;
                        basedOn: string | null;
                        /** Format: date-time */
                        createdAt: string;
                        createdBy: string;
                        /** Format: date-time */
                        updatedAt: string;
                        issuedAt: string | null;
                        purpose: string | null;
                        remarks: string | null;
                        summary: {
                            findings: {
                                note: number;
                                warning: number;
                                openEnd: number;
                            };
                            worstResidual: number;
                            levels: number;
                            wallLines: number;
                        };
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            412: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            413: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            422: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            428: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    RevisionsController_issue: {
        parameters: {
            query?: never;
            header: {
                /** @description The ETag that the caller saw */
                "If-Match": string;
            };
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody: {
            content: {
                "application/json": {
                    purpose: string;
                    remarks?: string;
                };
            };
        };
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** Format: uuid */
                        id: string;
                        number: number;
                        name: string;
                        /** @enum {string} */
                        state: "draft" | "issued";
                        /** @description SHA-256 of the building’s canonical text, RFC 8785 */
                        hash: string;
                        version: number;
                        basedOn: string | null;
                        /** Format: date-time */
                        createdAt: string;
                        createdBy: string;
                        /** Format: date-time */
                        updatedAt: string;
                        issuedAt: string | null;
                        purpose: string | null;
                        remarks: string | null;
                        summary: {
                            findings: {
                                note: number;
                                warning: number;
                                openEnd: number;
                            };
                            worstResidual: number;
                            levels: number;
                            wallLines: number;
                        };
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            409: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            412: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            428: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    AnalysesController_analysis: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        schema: "groundward.analysis/1";
                        /** @description Every number in the file and in its results is in these units and their products. */
                        units: {
                            /** @constant */
                            length: "ft";
                            /** @constant */
                            force: "kip";
                        } | {
                            /** @constant */
                            length: "m";
                            /** @constant */
                            force: "kN";
                        };
                        demands: {
                            /** @description Key of the member, such as `1/L2/1a` */
                            member: string;
                            /** @enum {string} */
                            kind: "level" | "diaphragm-span" | "opening" | "transfer-diaphragm" | "strut" | "collector" | "wall-line" | "pier" | "support";
                            /** @enum {string} */
                            quantity: "force" | "diaphragm-force" | "storey-shear" | "overturning-moment" | "drift" | "centre-of-mass-x" | "centre-of-mass-y" | "centre-of-rigidity-x" | "centre-of-rigidity-y" | "torsion" | "torsional-ratio" | "torsional-amplification" | "shear" | "unit-shear" | "net-unit-shear" | "moment" | "chord-force" | "secondary-moment" | "corner-force" | "axial-tension" | "axial-compression" | "design-tension" | "design-compression" | "connection-force" | "reaction" | "end-tension" | "end-compression" | "deflection" | "deflection-ratio" | "ratio" | "hold-down-ratio" | "uplift" | "bearing";
                            /** @description Load case or sub-case (`EX`, `EX/+e`); `gravity` with gravity alone; D, L, Lr, S for components */
                            case: string;
                            /** @description 1 along the case’s direction, -1 against it */
                            sense: 1 | -1;
                            /** @description Absent for the unfactored component */
                            combination?: string;
                            value: number;
                            unit: string;
                            /** @description Place on plan where the value occurs [length] */
                            at?: [
                                number,
                                number
                            ];
                            /** @description The rule that governed it, where several compete */
                            governs?: string;
                        }[];
                        diagrams: ({
                            /** @constant */
                            kind: "diaphragm";
                            /** @description `level/diaphragm` */
                            member: string;
                            level: string;
                            case: string;
                            /** @description Unit vector t along the load */
                            along: [
                                number,
                                number
                            ];
                            /** @description Unit vector s across the load */
                            across: [
                                number,
                                number
                            ];
                            lines: {
                                line: string;
                                s: number;
                                /** @description Into the wall line, along t [force] */
                                reaction: number;
                            }[];
                            spans: {
                                member: string;
                                from: number;
                                to: number;
                            }[];
                            pieces: {
                                /** @description s at the start of the piece [length] */
                                from: number;
                                /** @description s at its end [length] */
                                to: number;
                                /** @description w [force/length]; coefficients of (s − from)⁰, (s − from)¹ …, as in all below */
                                load: number[];
                                /** @description V [force] */
                                shear: number[];
                                /** @description M [force·length] */
                                moment: number[];
                                /** @description Net depth d [length] */
                                depth: number[];
                                /** @description Chord depth D [length] */
                                chordDepth: number[];
                            }[];
                        } | {
                            /** @constant */
                            kind: "collector";
                            /** @description `level/line` */
                            member: string;
                            level: string;
                            line: string;
                            case: string;
                            /** @description Axial force, tension positive, linear between points; `at` is the distance along the line’s axis */
                            points: {
                                at: number;
                                axial: number;
                            }[];
                        } | {
                            /** @constant */
                            kind: "strut";
                            /** @description `level/diaphragm/corner/strut`, `drag` along the step or `end` along the end of a transfer diaphragm */
                            member: string;
                            level: string;
                            case: string;
                            /** @description On plan [length] */
                            from: [
                                number,
                                number
                            ];
                            /** @description [x, y] on plan [length] */
                            to: [
                                number,
                                number
                            ];
                            /** @description Axial force, tension positive, linear between points; `at` is the distance from `from` towards `to` */
                            points: {
                                at: number;
                                axial: number;
                            }[];
                        } | {
                            /** @constant */
                            kind: "transfer-diaphragm";
                            /** @description `level/diaphragm/corner` */
                            member: string;
                            level: string;
                            case: string;
                            /** @description Unit vector t along the load */
                            along: [
                                number,
                                number
                            ];
                            /** @description Unit vector s across the load */
                            across: [
                                number,
                                number
                            ];
                            /** @description s of the step [length] */
                            step: number;
                            /** @description s of the end away from it [length] */
                            end: number;
                            /** @description The interrupted chords that it takes */
                            chords: {
                                /** @description Corner of the outline where the chord ends, counted from 1 */
                                corner: number;
                                t: number;
                                /** @description At the step, tension positive [force] */
                                axial: number;
                            }[];
                            /** @description What its edges take of the chords at the step, lower and upper in t, tension positive [force] */
                            edges: {
                                /** @description At the step [length] */
                                t: number;
                                axial: number;
                            }[];
                            /** @description The floor between edges and interrupted chords, piece by piece */
                            panels: {
                                /** @description s at the start [length] */
                                from: number;
                                to: number;
                                /** @description t of its edges, as coefficients of (s − from) [length] */
                                lower: number[];
                                upper: number[];
                                /** @description Over `depth` the net unit shear: V/d with what the interrupted chords give off [force] */
                                shear: number[];
                                /** @description Net depth d of the whole cut [length] */
                                depth: number[];
                            }[];
                        } | {
                            /** @constant */
                            kind: "opening";
                            /** @description `level/diaphragm/opening` */
                            member: string;
                            level: string;
                            case: string;
                            /** @description Unit vector t along the cuts */
                            along: [
                                number,
                                number
                            ];
                            /** @description Unit vector s across them */
                            across: [
                                number,
                                number
                            ];
                            /** @description Every strip beside the opening at both sides of it: the forces at the corners with their signs */
                            ends: {
                                /** @description Side of the opening [length] */
                                s: number;
                                lower: {
                                    /** @description At the middle of the opening [length] */
                                    t: number;
                                    /** @description Tension positive, in sense 1 [force] */
                                    axial: number;
                                };
                                upper: {
                                    /** @description At the middle of the opening [length] */
                                    t: number;
                                    /** @description Tension positive, in sense 1 [force] */
                                    axial: number;
                                };
                                /** @description Of the strip alone, none at the middle of the opening [force·length] */
                                moment: number;
                            }[];
                        })[];
                        path: {
                            nodes: {
                                id: string;
                                /** @enum {string} */
                                kind: "mass" | "diaphragm-span" | "collector" | "wall-line" | "pier" | "end-post" | "support";
                                member: string;
                                /** @description The level, or the level above the storey, where the member stands */
                                level: string;
                            }[];
                            edges: {
                                from: string;
                                to: string;
                                case: string;
                                /** @description For sense 1 [force]; horizontal along the receiving line’s axis, vertical downwards */
                                force: number;
                                /** @enum {string} */
                                acts: "horizontal" | "vertical";
                            }[];
                        };
                        findings: {
                            code: string;
                            /** @enum {string} */
                            severity: "note" | "warning" | "open-end";
                            member: string;
                            sentence: string;
                            case?: string;
                            /** @description The numbers that decided it */
                            numbers?: {
                                [key: string]: number;
                            };
                        }[];
                        certificate: {
                            /** @description Largest equilibrium residual relative to the forces involved */
                            worstResidual: number;
                            bound: number;
                            /** @description Where it occurs */
                            worst: string;
                            /** @description The largest residual of each kind of check */
                            checks: {
                                what: string;
                                residual: number;
                            }[];
                        };
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    AnalysesController_demands: {
        parameters: {
            query?: {
                member?: string;
                kind?: "level" | "diaphragm-span" | "opening" | "transfer-diaphragm" | "strut" | "collector" | "wall-line" | "pier" | "support";
                quantity?: "force" | "diaphragm-force" | "storey-shear" | "overturning-moment" | "drift" | "centre-of-mass-x" | "centre-of-mass-y" | "centre-of-rigidity-x" | "centre-of-rigidity-y" | "torsion" | "torsional-ratio" | "torsional-amplification" | "shear" | "unit-shear" | "net-unit-shear" | "moment" | "chord-force" | "secondary-moment" | "corner-force" | "axial-tension" | "axial-compression" | "design-tension" | "design-compression" | "connection-force" | "reaction" | "end-tension" | "end-compression" | "deflection" | "deflection-ratio" | "ratio" | "hold-down-ratio" | "uplift" | "bearing";
                level?: string;
                case?: string;
                sense?: "1" | "-1";
                /** @description Empty for unfactored components */
                combination?: string;
                limit?: number;
                /** @description The `next` of the page before */
                after?: number;
            };
            header?: never;
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        demands: {
                            /** @description Key of the member, such as `1/L2/1a` */
                            member: string;
                            /** @enum {string} */
                            kind: "level" | "diaphragm-span" | "opening" | "transfer-diaphragm" | "strut" | "collector" | "wall-line" | "pier" | "support";
                            /** @enum {string} */
                            quantity: "force" | "diaphragm-force" | "storey-shear" | "overturning-moment" | "drift" | "centre-of-mass-x" | "centre-of-mass-y" | "centre-of-rigidity-x" | "centre-of-rigidity-y" | "torsion" | "torsional-ratio" | "torsional-amplification" | "shear" | "unit-shear" | "net-unit-shear" | "moment" | "chord-force" | "secondary-moment" | "corner-force" | "axial-tension" | "axial-compression" | "design-tension" | "design-compression" | "connection-force" | "reaction" | "end-tension" | "end-compression" | "deflection" | "deflection-ratio" | "ratio" | "hold-down-ratio" | "uplift" | "bearing";
                            /** @description Load case or sub-case (`EX`, `EX/+e`); `gravity` with gravity alone; D, L, Lr, S for components */
                            case: string;
                            /** @description 1 along the case’s direction, -1 against it */
                            sense: 1 | -1;
                            /** @description Absent for the unfactored component */
                            combination?: string;
                            value: number;
                            unit: string;
                            /** @description Place on plan where the value occurs [length] */
                            at?: [
                                number,
                                number
                            ];
                            /** @description The rule that governed it, where several compete */
                            governs?: string;
                        }[];
                        next: number | null;
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    AnalysesController_trace: {
        parameters: {
            query: {
                member: string;
                case: string;
            };
            header?: never;
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        schema: "groundward.trace/1";
                        /** @description Every number in the file and in its results is in these units and their products. */
                        units: {
                            /** @constant */
                            length: "ft";
                            /** @constant */
                            force: "kip";
                        } | {
                            /** @constant */
                            length: "m";
                            /** @constant */
                            force: "kN";
                        };
                        member: string;
                        case: string;
                        force: number;
                        up: {
                            member: string;
                            level: string;
                            force: number;
                            share: number;
                        }[];
                        down: {
                            member: string;
                            level: string;
                            force: number;
                            share: number;
                        }[];
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    AnalysesController_working: {
        parameters: {
            query: {
                member: string;
                quantity: "force" | "diaphragm-force" | "storey-shear" | "overturning-moment" | "drift" | "centre-of-mass-x" | "centre-of-mass-y" | "centre-of-rigidity-x" | "centre-of-rigidity-y" | "torsion" | "torsional-ratio" | "torsional-amplification" | "shear" | "unit-shear" | "net-unit-shear" | "moment" | "chord-force" | "secondary-moment" | "corner-force" | "axial-tension" | "axial-compression" | "design-tension" | "design-compression" | "connection-force" | "reaction" | "end-tension" | "end-compression" | "deflection" | "deflection-ratio" | "ratio" | "hold-down-ratio" | "uplift" | "bearing";
                /** @description Default the case with the largest value */
                case?: string;
                /** @description Default 1 */
                sense?: "1" | "-1";
                /** @description Default the unfactored component where there is one */
                combination?: string;
            };
            header?: never;
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        schema: "groundward.working/1";
                        /** @description Every number in the file and in its results is in these units and their products. */
                        units: {
                            /** @constant */
                            length: "ft";
                            /** @constant */
                            force: "kip";
                        } | {
                            /** @constant */
                            length: "m";
                            /** @constant */
                            force: "kN";
                        };
                        demand: {
                            /** @description Key of the member, such as `1/L2/1a` */
                            member: string;
                            /** @enum {string} */
                            kind: "level" | "diaphragm-span" | "opening" | "transfer-diaphragm" | "strut" | "collector" | "wall-line" | "pier" | "support";
                            /** @enum {string} */
                            quantity: "force" | "diaphragm-force" | "storey-shear" | "overturning-moment" | "drift" | "centre-of-mass-x" | "centre-of-mass-y" | "centre-of-rigidity-x" | "centre-of-rigidity-y" | "torsion" | "torsional-ratio" | "torsional-amplification" | "shear" | "unit-shear" | "net-unit-shear" | "moment" | "chord-force" | "secondary-moment" | "corner-force" | "axial-tension" | "axial-compression" | "design-tension" | "design-compression" | "connection-force" | "reaction" | "end-tension" | "end-compression" | "deflection" | "deflection-ratio" | "ratio" | "hold-down-ratio" | "uplift" | "bearing";
                            /** @description Load case or sub-case (`EX`, `EX/+e`); `gravity` with gravity alone; D, L, Lr, S for components */
                            case: string;
                            /** @description 1 along the case’s direction, -1 against it */
                            sense: 1 | -1;
                            /** @description Absent for the unfactored component */
                            combination?: string;
                            value: number;
                            unit: string;
                            /** @description Place on plan where the value occurs [length] */
                            at?: [
                                number,
                                number
                            ];
                            /** @description The rule that governed it, where several compete */
                            governs?: string;
                        };
                        /** @description The last step gives the demand */
                        steps: {
                            symbol: string;
                            /** @description What the step finds */
                            what?: string;
                            /** @description `symbol = expression` in the symbols of `values`, with + − · / ^ ( ) and abs, max, min, sqrt */
                            formula: string;
                            values: {
                                symbol: string;
                                value: number;
                                /** @description As it is printed: with the digits from which the printed result follows by the formula */
                                shown: string;
                                unit: string;
                                /** @description What it is, where the symbol alone does not say */
                                what?: string;
                                /** @description Where it comes from: the symbol of an earlier step; a demand, `member quantity case sense` with its combination behind it where there is one; a path into the building file, such as `levels[1].elevation`, where a number stands, or where the drawing or the solution stands from which the value was read; or `default` and the path of what the file leaves out */
                                from?: string;
                            }[];
                            result: number;
                            /** @description As it is printed: with the digits from which the printed result follows by the formula */
                            shown: string;
                            unit: string;
                            /** @description Clause of a standard, or the law */
                            clause?: string;
                        }[];
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            503: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    FoundationController_demands: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        schema: "groundward.foundation/1";
                        /** @description Every number in the file and in its results is in these units and their products. */
                        units: {
                            /** @constant */
                            length: "ft";
                            /** @constant */
                            force: "kip";
                        } | {
                            /** @constant */
                            length: "m";
                            /** @constant */
                            force: "kN";
                        };
                        building: string;
                        supports: {
                            member: string;
                            label: string;
                            line: string;
                            /** @description [x, y] on plan [length] */
                            at: [
                                number,
                                number
                            ];
                            demands: {
                                /** @enum {string} */
                                quantity: "shear" | "uplift" | "bearing" | "moment";
                                case: string;
                                sense: 1 | -1;
                                combination?: string;
                                value: number;
                                unit: string;
                                governing: boolean;
                            }[];
                        }[];
                        totals: {
                            case: string;
                            sense: 1 | -1;
                            fx: number;
                            fy: number;
                            fz: number;
                            mx: number;
                            my: number;
                            mz: number;
                        }[];
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    FoundationController_csv: {
        parameters: {
            query?: never;
            header?: never;
            path: {
                projectId: string;
                revisionId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "text/csv": string;
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    ComparisonsController_compare: {
        parameters: {
            query: {
                before: string;
                after: string;
                /** @description Whether to share each change among the edits; default false */
                causes?: "true" | "false";
            };
            header?: never;
            path: {
                projectId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        schema: "groundward.comparison/1";
                        edits: {
                            id: string;
                            what: string;
                            patch: {
                                [key: string]: unknown;
                            }[];
                        }[];
                        /** @description Members whose ids changed and that were known again by their place */
                        matches?: {
                            kind: string;
                            before: string;
                            after: string;
                        }[];
                        /** @description How the causes were found */
                        method?: {
                            /** @constant */
                            kind: "exact";
                        } | {
                            /** @constant */
                            kind: "sampled";
                            pairs: number;
                            seed: number;
                        };
                        changes: {
                            member: string;
                            /** @enum {string} */
                            kind: "level" | "diaphragm-span" | "opening" | "transfer-diaphragm" | "strut" | "collector" | "wall-line" | "pier" | "support";
                            /** @enum {string} */
                            quantity: "force" | "diaphragm-force" | "storey-shear" | "overturning-moment" | "drift" | "centre-of-mass-x" | "centre-of-mass-y" | "centre-of-rigidity-x" | "centre-of-rigidity-y" | "torsion" | "torsional-ratio" | "torsional-amplification" | "shear" | "unit-shear" | "net-unit-shear" | "moment" | "chord-force" | "secondary-moment" | "corner-force" | "axial-tension" | "axial-compression" | "design-tension" | "design-compression" | "connection-force" | "reaction" | "end-tension" | "end-compression" | "deflection" | "deflection-ratio" | "ratio" | "hold-down-ratio" | "uplift" | "bearing";
                            case: string;
                            sense: 1 | -1;
                            combination?: string;
                            before: number | null;
                            after: number | null;
                            unit: string;
                            /** @enum {string} */
                            class: "added" | "removed" | "moved" | "raised" | "lowered" | "unchanged";
                            causes: {
                                edit: string;
                                /** @description In the demand’s own unit; shares add up to after − before */
                                share: number;
                                /** @description Standard error of a share that was sampled */
                                error?: number;
                            }[];
                        }[];
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            503: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    HistoryController_of: {
        parameters: {
            query: {
                member: string;
                quantity: "force" | "diaphragm-force" | "storey-shear" | "overturning-moment" | "drift" | "centre-of-mass-x" | "centre-of-mass-y" | "centre-of-rigidity-x" | "centre-of-rigidity-y" | "torsion" | "torsional-ratio" | "torsional-amplification" | "shear" | "unit-shear" | "net-unit-shear" | "moment" | "chord-force" | "secondary-moment" | "corner-force" | "axial-tension" | "axial-compression" | "design-tension" | "design-compression" | "connection-force" | "reaction" | "end-tension" | "end-compression" | "deflection" | "deflection-ratio" | "ratio" | "hold-down-ratio" | "uplift" | "bearing";
                case: string;
                sense: "1" | "-1";
                combination?: string;
            };
            header?: never;
            path: {
                projectId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        member: string;
                        /** @enum {string} */
                        quantity: "force" | "diaphragm-force" | "storey-shear" | "overturning-moment" | "drift" | "centre-of-mass-x" | "centre-of-mass-y" | "centre-of-rigidity-x" | "centre-of-rigidity-y" | "torsion" | "torsional-ratio" | "torsional-amplification" | "shear" | "unit-shear" | "net-unit-shear" | "moment" | "chord-force" | "secondary-moment" | "corner-force" | "axial-tension" | "axial-compression" | "design-tension" | "design-compression" | "connection-force" | "reaction" | "end-tension" | "end-compression" | "deflection" | "deflection-ratio" | "ratio" | "hold-down-ratio" | "uplift" | "bearing";
                        case: string;
                        /** @enum {string} */
                        sense: "1" | "-1";
                        combination?: string;
                        unit: string | null;
                        points: {
                            /** Format: uuid */
                            revisionId: string;
                            number: number;
                            name: string;
                            /** @enum {string} */
                            state: "draft" | "issued";
                            value: number | null;
                        }[];
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    AuditController_page: {
        parameters: {
            query?: {
                /** @description Entries before this one; default from the latest */
                before?: string;
                /** @description Default 100 */
                limit?: number;
            };
            header?: never;
            path: {
                projectId: string;
            };
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        entries: {
                            id: string;
                            at: string;
                            /** @description null where it was written outside the service */
                            by: string | null;
                            what: string;
                        }[];
                        next: string | null;
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            404: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
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
                "application/json": {
                    /** Format: email */
                    email: string;
                    password: string;
                    rememberMe?: boolean;
                } & {
                    [key: string]: unknown;
                };
            };
        };
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        user: {
                            id: string;
                            name: string;
                            email: string;
                        } & {
                            [key: string]: unknown;
                        };
                    } & {
                        [key: string]: unknown;
                    };
                };
            };
            /** @description Problem */
            400: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            401: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
            /** @description Problem */
            429: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
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
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": {
                        /** @constant */
                        success: true;
                    } & {
                        [key: string]: unknown;
                    };
                };
            };
            /** @description Problem */
            403: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/problem+json": {
                        type: string;
                        title: string;
                        status: number;
                        detail: string;
                        instance: string;
                        /** @description The same codes as the engine’s faults */
                        code: string;
                        faults?: {
                            code: string;
                            path: string;
                            found: string;
                            expected: string;
                            hint?: string;
                        }[];
                        /** @description With 412: what is saved now */
                        current?: unknown;
                    };
                };
            };
        };
    };
    session: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description Done */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": ({
                        session: {
                            /** Format: date-time */
                            expiresAt: string;
                        } & {
                            [key: string]: unknown;
                        };
                        user: {
                            id: string;
                            name: string;
                            email: string;
                        } & {
                            [key: string]: unknown;
                        };
                    } & {
                        [key: string]: unknown;
                    }) | null;
                };
            };
        };
    };
    openapi: {
        parameters: {
            query?: never;
            header?: never;
            path?: never;
            cookie?: never;
        };
        requestBody?: never;
        responses: {
            /** @description This document */
            200: {
                headers: {
                    [name: string]: unknown;
                };
                content: {
                    "application/json": Record<string, never>;
                };
            };
        };
    };
}
