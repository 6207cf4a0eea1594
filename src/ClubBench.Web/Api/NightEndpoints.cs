using ClubBench.Club.UseCases.Nights;
using ClubBench.Club.UseCases.Room;
using ClubBench.Web.SignIn;

namespace ClubBench.Web.Api;

/// <summary>Nights and the room.</summary>
internal static class NightEndpoints
{
    public static void MapNights(this IEndpointRouteBuilder api)
    {
        api.MapGet("/nights", async (HttpContext http, ListNights list, CancellationToken cancellation) =>
                Answers.Of(await list.Run(http.User.ToActor(), new ListNightsInput(), cancellation), nights => new Listing<NightSummary>(nights)))
            .Described("ListNights", "Nights of all group builds, newest first.",
                answer: """{ "items": [ { "id": "0b5a0c62-1d3c-4b0e-a9c8-0e7e4a1f2b11", "groupBuildName": "Winter build", "title": "Transmit", "date": "2026-12-01", "state": "open", "present": 9 } ] }""");

        api.MapGet("/nights/{id:guid}/room", async (Guid id, HttpContext http, OpenRoom open, CancellationToken cancellation) =>
                Answers.Of(await open.Run(http.User.ToActor(), new OpenRoomInput(id), cancellation), room => room))
            .Described("OpenRoom", "The live picture of a night: boards by stages, the help queue, instruments.",
                answer: """{ "title": "Transmit", "boards": [ { "tag": "Q05", "bandName": "20 m", "isPresent": true, "cells": [ { "stage": "A5", "action": "change", "progress": "measured", "hold": "none", "lastVerdict": "good" } ] } ], "help": [], "lastReadings": [ { "ordinal": 41, "tag": "Q05", "stage": "A5", "point": "A5.L4.L", "kind": "inductance", "valueSi": 6.76e-7, "verdict": "good" } ], "alerts": [] }""");
    }
}
