using System.ComponentModel.DataAnnotations;

namespace ClubBench.Web.Commands;

/// <summary>Settings of an installation: section <c>ClubBench</c> of appsettings, or environment variables like <c>ClubBench__DataFolder</c>.</summary>
public sealed class ClubSettings
{
    public const string Section = "ClubBench";

    /// <summary>Folder of the database; relative to the application's folder.</summary>
    [Required(ErrorMessage = "Setting ClubBench:DataFolder is empty: name a folder the program may write to.")]
    public string DataFolder { get; set; } = "data";
}
