using Microsoft.EntityFrameworkCore.Storage.ValueConversion;

namespace ClubBench.Club.Persistence;

/// <summary>Times are kept in UTC and come back marked so, on every provider.</summary>
internal sealed class UtcConverter() : ValueConverter<DateTime, DateTime>(
    t => t.Kind == DateTimeKind.Utc ? t : t.ToUniversalTime(),
    t => DateTime.SpecifyKind(t, DateTimeKind.Utc));
